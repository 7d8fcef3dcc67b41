using System.Globalization;
using Selector.Engine.Circuits;

namespace Selector.Cli.Compute;

/// <summary>One row of a table, by column name; messages name the column.</summary>
internal sealed class CaseRow(IReadOnlyDictionary<string, string> cells)
{
    /// <summary>A number that must be there.</summary>
    /// <exception cref="CaseFault">Empty or no number.</exception>
    public double Number(string column) => Optional(column)
        ?? throw new CaseFault($"{column}: is empty. Type a number in SI units.");

    /// <summary>A number, or what stands for an absent element.</summary>
    public double Number(string column, double absent) => Optional(column) ?? absent;

    /// <summary>A number; null when the cell is empty or the column missing.</summary>
    public double? Optional(string column)
    {
        var text = Text(column);
        if (text.Length == 0)
        {
            return null;
        }

        return double.TryParse(text, NumberStyles.Float, CultureInfo.InvariantCulture, out var value) && double.IsFinite(value)
            ? value
            : throw new CaseFault($"{column}: '{Short(text)}' is no number. Type one with a decimal point and no unit.");
    }

    /// <summary>One of the given words.</summary>
    public T Word<T>(string column, params (string Word, T Value)[] words)
    {
        foreach (var (word, value) in words)
        {
            if (string.Equals(word, Text(column), StringComparison.OrdinalIgnoreCase))
            {
                return value;
            }
        }

        throw new CaseFault($"{column}: '{Short(Text(column))}' is none of {string.Join(", ", words.Select(w => w.Word))}.");
    }

    /// <summary>The text of a cell, empty when the column is missing.</summary>
    public string Text(string column) => cells.TryGetValue(column, out var text) ? text.Trim() : "";

    /// <summary>Turns a solver's status into the message of the error cell.</summary>
    public static void Check(SolveStatus status)
    {
        if (status != SolveStatus.Solved)
        {
            throw new CaseFault(status switch
            {
                SolveStatus.NoOperatingPoint => "no operating point",
                SolveStatus.BadInput => "a value is outside the range that the model covers",
                SolveStatus.OutOfBudget => "no solution within the bound on work",
                _ => status.ToString(),
            });
        }
    }

    /// <summary>A number as it is written into a table: it reads back to the same bits.</summary>
    public static string Say(double value) => value.ToString("R", CultureInfo.InvariantCulture);

    private static string Short(string text) => text.Length <= 30 ? text : text[..30] + "…";
}

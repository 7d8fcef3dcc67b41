using System.Collections.Immutable;
using System.Globalization;
using Selector.Engine.Parts;
using Selector.Storage;

namespace Selector.Application.Catalogue;

/// <summary>Reads one row of a catalogue file and gathers everything that is wrong with it, not only the first.</summary>
internal sealed class PartRow(FamilySpec family, CsvLine row)
{
    private const int MostPieces = 1_000_000_000;

    private readonly List<RowFault> _faults = [];

    public IReadOnlyList<RowFault> Faults => _faults;

    /// <summary>The part; null when anything is wrong.</summary>
    public Part? Read()
    {
        var part = new Part
        {
            Family = family,
            Maker = Named(PartColumns.Maker),
            OrderingCode = Named(PartColumns.OrderingCode),
            ShopNumber = Text(PartColumns.ShopNumber),
            Technology = Technology(),
            Package = Text(PartColumns.Package),
            Lifecycle = ReadLifecycle(),
            Stock = Whole(PartColumns.Stock, 0, 0),
            LeastOrder = Whole(PartColumns.LeastOrder, 1, 1),
            Multiple = Whole(PartColumns.Multiple, 1, 1),
            Prices = Prices(),
            Source = Text(PartColumns.Source),
            Ratings = [.. family.Ratings.Select(Rating)],
        };
        if (_faults.Count == 0)
        {
            foreach (var check in PartCheck.Cross(part))
            {
                Add(family.Rating(check.Keys[0]).Column, check.Message, "Correct the row.");
            }
        }

        return _faults.Count == 0 ? part : null;
    }

    private void Add(string column, string reason, string remedy) => _faults.Add(new(row.Number, column, reason, remedy));

    private string Text(string column)
    {
        var text = SafeCell.In(row[column]);
        if (text.Length > Limits.Cell)
        {
            Add(column, $"The text is {text.Length} characters long.", $"Shorten it to {Limits.Cell}.");
        }

        return text;
    }

    private string Named(string column)
    {
        var text = Text(column).Trim();
        if (text.Length == 0)
        {
            Add(column, "The cell is empty.", "Fill it in.");
        }

        return text;
    }

    private string Technology()
    {
        var text = Text(PartColumns.Technology).Trim();
        if (text.Length == 0)
        {
            return family.Technologies[0];
        }

        if (!family.Technologies.Contains(text))
        {
            Add(PartColumns.Technology, $"\u201c{PlainText.Short(text)}\u201d is no technology of {family.Plural}.",
                $"Write {PartCheck.Listed(family.Technologies)}.");
        }

        return text;
    }

    private Lifecycle ReadLifecycle()
    {
        var word = row[PartColumns.Lifecycle].Trim();
        if (word.Length == 0)
        {
            return Lifecycle.Active;
        }

        if (LifecycleWords.Read(word) is { } lifecycle)
        {
            return lifecycle;
        }

        Add(PartColumns.Lifecycle, $"\u201c{PlainText.Short(word)}\u201d is none of the words.", $"Write {PartCheck.Listed(LifecycleWords.All)}.");
        return default;
    }

    private int Whole(string column, int least, int otherwise)
    {
        var cell = row[column].Trim();
        if (cell.Length == 0)
        {
            return otherwise;
        }

        if (int.TryParse(cell, NumberStyles.None, CultureInfo.InvariantCulture, out var value) && value >= least && value <= MostPieces)
        {
            return value;
        }

        Add(column, $"\u201c{PlainText.Short(cell)}\u201d is no number of pieces.", $"Write a whole number from {least}, without separators.");
        return otherwise;
    }

    private PriceList Prices()
    {
        var currency = row[PartColumns.Currency].Trim();
        var date = row[PartColumns.PriceDate].Trim();
        var breaks = ImmutableArray<PriceBreak>.Empty;
        try
        {
            breaks = PriceBreaks.Parse(row[PartColumns.PriceBreaks]);
        }
        catch (FormatException e)
        {
            Add(PartColumns.PriceBreaks, e.Message, "Write quantity:price from the smallest quantity up, for example 1:0.85 10:0.72.");
        }

        if (currency.Length == 0 ? !breaks.IsEmpty : currency.Length != 3 || !currency.All(char.IsAsciiLetterUpper))
        {
            Add(PartColumns.Currency, "A price needs its currency.", "Write three capital letters, for example EUR.");
        }

        if (date.Length != 0 && !DateOnly.TryParseExact(date, "yyyy-MM-dd", CultureInfo.InvariantCulture, DateTimeStyles.None, out _))
        {
            Add(PartColumns.PriceDate, $"\u201c{PlainText.Short(date)}\u201d is no day.", "Write year-month-day, for example 2026-03-31.");
        }

        return new PriceList(currency, date, breaks);
    }

    private double Rating(RatingSpec spec)
    {
        var (value, fault) = RatingCell.Read(spec, row[spec.Column]);
        if ((fault ?? PartCheck.Rating(spec, value)) is { } wrong)
        {
            // The engine's sentences say what to do as their last one.
            var end = wrong.IndexOf(". ", StringComparison.Ordinal);
            Add(spec.Column, end < 0 ? wrong : wrong[..(end + 1)], end < 0 ? "Correct the cell." : wrong[(end + 2)..]);
        }

        return value;
    }
}

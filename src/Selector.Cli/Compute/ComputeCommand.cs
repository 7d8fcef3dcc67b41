using System.Collections.Immutable;
using System.ComponentModel;
using Spectre.Console;
using Spectre.Console.Cli;

namespace Selector.Cli.Compute;

/// <summary>compute KIND CASES.csv --out RESULTS.csv</summary>
internal sealed class ComputeCommand : Command<ComputeCommand.Settings>
{
    private static readonly ImmutableArray<ICaseKind> Kinds = [new RectifierKind(), new ConverterKind(), new BankKind(), new InrushKind(), new HoldUpKind(), new ReservoirKind()];

    public override int Execute(CommandContext context, Settings settings, CancellationToken cancellationToken)
    {
        var kind = Kinds.FirstOrDefault(k => k.Name == settings.Kind);
        if (kind is null)
        {
            return Refuse($"'{settings.Kind}' is no kind. Choose one of {string.Join(", ", Kinds.Select(k => k.Name))}.");
        }

        try
        {
            var (rows, faults) = CaseTable.Solve(kind, settings.Cases, settings.Out, cancellationToken);
            AnsiConsole.WriteLine($"{rows} rows, {faults} with an error, written to {settings.Out}");
            return 0;
        }
        catch (IOException fault)
        {
            return Refuse(fault.Message);
        }
        catch (UnauthorizedAccessException fault)
        {
            return Refuse(fault.Message);
        }
        catch (CaseFault fault)
        {
            return Refuse(fault.Message);
        }
    }

    private static int Refuse(string message)
    {
        Console.Error.WriteLine(message);
        return 1;
    }

    internal sealed class Settings : CommandSettings
    {
        [CommandArgument(0, "<KIND>")]
        [Description("rectifier, converter, bank, inrush, holdup or reservoir")]
        public required string Kind { get; init; }

        [CommandArgument(1, "<CASES>")]
        [Description("Table of cases, CSV with a header")]
        public required string Cases { get; init; }

        [CommandOption("--out <RESULTS>", true)]
        [Description("Table that is written")]
        public required string Out { get; init; }
    }
}

using System.ComponentModel;
using Selector.Application.Assessing;
using Selector.Engine;
using Selector.Engine.Circuits;
using Spectre.Console.Cli;

namespace Selector.Cli.Assess;

/// <summary>assess SUPPLY.json</summary>
internal sealed class AssessCommand : Command<AssessCommand.Settings>
{
    public override int Execute(CommandContext context, Settings settings, CancellationToken cancellationToken)
    {
        try
        {
            var catalogue = settings.Catalogue is { } folder
                ? Directory.GetFiles(folder, "*.csv").Order(StringComparer.Ordinal).Select(f => (Path.GetFileNameWithoutExtension(f), File.ReadAllText(f))).ToList()
                : [];
            if (settings.Catalogue is { } empty && catalogue.Count == 0)
            {
                return Refuse($"{empty}: there is no family file (*.csv) in this folder.");
            }

            var assessment = new OfflineDesk(Standard.Registry).Assess(File.ReadAllText(settings.Supply), catalogue, Budget.Until(cancellationToken));
            Console.Out.Write(settings.Json ? LedgerJson.Of(assessment) : LedgerText.Of(assessment));
            return assessment.Ledger.Fault is null ? 0 : 1;
        }
        catch (Exception fault) when (fault is IOException or UnauthorizedAccessException or InvalidDataException)
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
        [CommandArgument(0, "<SUPPLY>")]
        [Description("Supply as JSON: {\"version\":1,\"name\":..,\"texts\":{field:text}}")]
        public required string Supply { get; init; }

        [CommandOption("--catalogue <FOLDER>")]
        [Description("Folder with a CSV file for each family; by default the demo catalogue")]
        public string? Catalogue { get; init; }

        [CommandOption("--json")]
        [Description("Print the ledger as JSON instead of a table")]
        public bool Json { get; init; }
    }
}

using System.Reflection;
using Selector.Engine.Supplies;

namespace Selector.Documents.Sheets;

/// <summary>
/// Everything that a paper is made from. It is read and never computed again here: the paper must say what the ledger says.
/// </summary>
/// <param name="SupplyName">As the designer calls it.</param>
/// <param name="SupplyNumber">The shop's number of the supply.</param>
/// <param name="Edited">Day and time of the last edit, already in the reader's form.</param>
/// <param name="Requirement">As typed and as understood.</param>
/// <param name="Design">Which part fills which position.</param>
/// <param name="Ledger">The assessment.</param>
/// <param name="Issue">Letter of the issue.</param>
/// <param name="Drawn">Who designed it; empty leaves a line to sign on.</param>
public sealed record PaperInput(
    string SupplyName,
    int SupplyNumber,
    string Edited,
    RequirementValues Requirement,
    Design Design,
    Ledger Ledger,
    string Issue = "not issued",
    string Drawn = "")
{
    /// <summary>Who checked it; empty leaves a line to sign on.</summary>
    public string Checked { get; init; } = "";

    /// <summary>Who approved it; empty leaves a line to sign on.</summary>
    public string Approved { get; init; } = "";

    /// <summary>Name of the shop; empty when it has not been given.</summary>
    public string Shop { get; init; } = "";

    /// <summary>What kind of document stands behind the policy, in a sentence.</summary>
    public string PolicyStanding { get; init; } = "";

    /// <summary>Version of the program that assessed the supply.</summary>
    public string Engine { get; init; } = EngineVersion;

    private static string EngineVersion { get; } =
        (typeof(Ledger).Assembly.GetCustomAttribute<AssemblyInformationalVersionAttribute>()?.InformationalVersion ?? "unknown").Split('+')[0];
}

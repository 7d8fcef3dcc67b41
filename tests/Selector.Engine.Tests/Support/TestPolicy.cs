using System.Collections.Immutable;
using Selector.Engine.Derating;

namespace Selector.Engine.Tests.Support;

/// <summary>The general industrial policy as it ships, read from its file.</summary>
internal static class TestPolicy
{
    public static Policy Industrial { get; } = Read();

    private static Policy Read()
    {
        using var stream = typeof(TestPolicy).Assembly.GetManifestResourceStream("general-industrial.csv")!;
        using var reader = new StreamReader(stream);
        return new Policy("general-industrial", "General industrial", 1, "common practice", [
            .. reader.ReadToEnd().Split('\n', StringSplitOptions.RemoveEmptyEntries).Skip(1).Select(line => line.Split(','))
                .Select(c => new Clause(
                    c[0], c[1], c[2], PolicyReader.Operator(c[3]), PolicyReader.Basis(c[4]), c[5], c[6], PolicyReader.Certainty(c[7]), c[8])),
        ]);
    }
}

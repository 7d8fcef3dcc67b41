using System.Text;
using System.Text.Encodings.Web;
using System.Text.Json;
using Selector.Application.Assessing;
using Selector.Engine.Supplies;

namespace Selector.Cli.Assess;

/// <summary>The ledger as JSON, version 1: numbers in SI units, null where there is none.</summary>
internal static class LedgerJson
{
    private static readonly JsonWriterOptions Writing = new() { Indented = true, Encoder = JavaScriptEncoder.UnsafeRelaxedJsonEscaping };

    public static string Of(OfflineAssessment assessment)
    {
        using var buffer = new MemoryStream();
        using (var json = new Utf8JsonWriter(buffer, Writing))
        {
            json.WriteStartObject();
            json.WriteNumber("version", 1);
            json.WriteString("name", assessment.Name);
            json.WriteString("policy", assessment.Ledger.Policy);
            json.WriteString("fault", assessment.Ledger.Fault);
            json.WriteStartArray("faults");
            foreach (var fault in assessment.Faults)
            {
                json.WriteStringValue(fault);
            }

            json.WriteEndArray();
            Counts(json, assessment.Ledger.Counts);
            json.WriteStartArray("rows");
            foreach (var row in assessment.Ledger.Rows)
            {
                Row(json, row);
            }

            json.WriteEndArray();
            json.WriteEndObject();
        }

        return Encoding.UTF8.GetString(buffer.ToArray()) + "\n";
    }

    private static void Counts(Utf8JsonWriter json, Counts counts)
    {
        json.WriteStartObject("counts");
        json.WriteNumber("hold", counts.Hold);
        json.WriteNumber("lack", counts.Lack);
        json.WriteNumber("not_rated", counts.NotRated);
        json.WriteNumber("not_assessed", counts.NotAssessed);
        json.WriteNumber("not_covered", counts.NotCovered);
        json.WriteNumber("not_usable", counts.NotUsable);
        json.WriteNumber("empty", counts.Empty);
        json.WriteEndObject();
    }

    private static void Row(Utf8JsonWriter json, LedgerRow row)
    {
        json.WriteStartObject();
        json.WriteString("position", row.Position);
        json.WriteString("kind", row.Kind);
        json.WriteString("stress", row.Name);
        json.WriteString("unit", row.Spec?.Unit.Symbol);
        Number(json, "value", row.Stress);
        Number(json, "allowed", row.Allowed);
        Number(json, "rating", row.Rating);
        Number(json, "margin", row.Margin);
        Number(json, "margin_without_derating", row.MarginUnderated);
        json.WriteString("verdict", Word(row.Verdict));
        json.WriteString("reason", row.Reason);
        json.WriteString("corner", row.Corner);
        json.WriteString("equation", row.Spec?.Equation);
        json.WriteStartObject("at");
        foreach (var (axis, value) in row.At)
        {
            json.WriteNumber(axis, value);
        }

        json.WriteEndObject();
        json.WriteEndObject();
    }

    private static void Number(Utf8JsonWriter json, string name, double? value)
    {
        if (value is { } v)
        {
            json.WriteNumber(name, v);
        }
        else
        {
            json.WriteNull(name);
        }
    }

    private static string Word(Verdict verdict) => verdict switch
    {
        Verdict.Holds => "holds",
        Verdict.Lacks => "lacks",
        Verdict.NotUsable => "not usable",
        Verdict.NotRated => "not rated",
        Verdict.NotCovered => "not covered",
        Verdict.NotAssessed => "not assessed",
        Verdict.NoPart => "no part",
        _ => "no demand",
    };
}

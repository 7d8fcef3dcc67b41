using Selector.Engine.Parts;
using Selector.Engine.Parts.Families;

namespace Selector.Application.Tests.Support;

/// <summary>Catalogue files of fixed resistors.</summary>
internal static class Resistors
{
    public const string Heading = "maker,ordering_code,technology,stock,currency,price_date,price_breaks,resistance_ohm,power_w";

    public static FamilySpec Family => ResistorFamily.Spec;

    public static string File(params string[] rows) => Heading + "\n" + string.Join('\n', rows) + "\n";

    /// <summary>A row that is good.</summary>
    public static string Row(string code, string ohms = "1k", string watts = "0.5", string price = "1:0.05 100:0.0213") =>
        $"Acme,{code},film,100,EUR,2026-03-31,{price},{ohms},{watts}";

    /// <summary>A file in which the power also says how it falls with temperature, so that it can be rated.</summary>
    public static string Rated(params string[] rows) =>
        Heading + ",power_knee_degc,power_zero_degc\n" + string.Join('\n', rows.Select(r => r + ",70,155")) + "\n";

    public static Part Part(string code = "T-1", double ohms = 1000, double watts = 0.5) => new()
    {
        Family = Family,
        Maker = "Acme",
        OrderingCode = code,
        Technology = "film",
        Ratings =
        [
            .. Family.Ratings.Select(r => r.Key switch
            {
                ResistorFamily.Resistance => ohms,
                ResistorFamily.Power => watts,
                _ => double.NaN,
            }),
        ],
    };
}

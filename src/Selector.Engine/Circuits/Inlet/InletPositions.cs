using System.Collections.Immutable;
using Selector.Engine.Circuits.Mains;
using Selector.Engine.Parts.Families;
using Selector.Engine.Supplies;

namespace Selector.Engine.Circuits.Inlet;

/// <summary>Positions before the transformer with their hand-book starting values.</summary>
internal static class InletPositions
{
    public const string J1 = "J1";
    public const string S1 = "S1";
    public const string F1 = "F1";
    public const string XF1 = "XF1";
    public const string RT1 = "RT1";
    public const string RV1 = "RV1";

    /// <summary>Primary current of an everyday transformer for each watt of output, over the mains voltage.</summary>
    private const double ApparentOverOutput = 2;

    public static ImmutableArray<PositionSpec> List(RequirementValues r)
    {
        var none = ImmutableDictionary<string, double>.Empty;
        var current = ApparentOverOutput * r[CommonFields.OutputVoltage] * r[CommonFields.LoadFull] / r[MainsFields.Voltage];
        ImmutableArray<PositionSpec> always =
        [
            new(J1, "mains inlet", ConnectorFamily.Id, 1, none) { Technologies = [ConnectorFamily.Inlet] },
            new(S1, "mains switch", SwitchFamily.Id, 1, none),
            new(F1, "primary fuse", FuseFamily.Id, 1, none
                .Add(FuseFamily.Current, 1.6 * current).Add(FuseFamily.OpensAt, 2.75).Add(FuseFamily.Loss, 1.6))
            {
                StandInReason = "1.6 times twice the output power over the mains",
            },
            new(XF1, "holder of the fuse", FuseHolderFamily.Id, 1, none),
        ];
        return
        [
            .. always,
            .. InletFields.HasLimiter(r) ? [new PositionSpec(RT1, "inrush limiter", LimiterFamily.Id, 1, none
                .Add(LimiterFamily.Cold, 10).Add(LimiterFamily.Hot, 0.5).Add(LimiterFamily.Current, 2)) { StandInReason = "10 Ω, 2 A" }] : ImmutableArray<PositionSpec>.Empty,
            .. r.Is(InletFields.Varistor, "yes") ? [new PositionSpec(RV1, "varistor", VaristorFamily.Id, 1, none)] : ImmutableArray<PositionSpec>.Empty,
        ];
    }
}

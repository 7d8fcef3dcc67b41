using Selector.Engine.Supplies;

namespace Selector.Engine.Circuits.Thermal;

/// <summary>How much the air in a closed case is warmer than the room: by a resistance that is given, or by the walls.</summary>
internal sealed class CaseAir
{
    private const double Painted = 0.9;
    private const double Bare = 0.1;
    private const double Millimetre = 1e-3;

    private readonly double _resistance;
    private readonly Enclosure? _walls;

    private CaseAir(double resistance, Enclosure? walls) => (_resistance, _walls) = (resistance, walls);

    /// <summary>Null for an open case.</summary>
    public static CaseAir? Of(RequirementValues r, double pressure) =>
        r.Is(Surroundings.Case, Surroundings.Given) ? new CaseAir(r[ThermalStage.Resistance], null)
        : !r.Is(Surroundings.Case, Surroundings.Closed) ? null
        : new CaseAir(0, new Enclosure(
            r[ThermalStage.Width] * Millimetre, r[ThermalStage.Height] * Millimetre, r[ThermalStage.Depth] * Millimetre,
            r.Is(ThermalStage.Finish, ThermalStage.Painted) ? Painted : Bare, pressure));

    public double Rise(double power, double ambient) => _walls?.Rise(power, ambient) ?? power * _resistance;
}

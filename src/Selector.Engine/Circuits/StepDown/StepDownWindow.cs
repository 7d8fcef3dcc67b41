using System.Collections.Immutable;
using Selector.Engine.Circuits.Reservoir;
using Selector.Engine.Circuits.Thermal;
using Selector.Engine.Parts.Families;
using Selector.Engine.Quantities;
using Selector.Engine.Supplies;
using static Selector.Engine.Circuits.Dependences;
using static Selector.Engine.Circuits.StepDown.StepDownPositions;

namespace Selector.Engine.Circuits.StepDown;

/// <summary>
/// The window of coil, output capacitor and its ESR within which the maker calls the regulator stable: six limits of U1, held by the
/// values of L1 and C2 new and aged, warm and cold. Without the maker's figures the rows are not rated.
/// </summary>
internal sealed class StepDownWindow
{
    private readonly int[] _places;

    public StepDownWindow(Func<StressSpec, int> stress, RequirementValues r)
    {
        ImmutableArray<Dependence> coil = [.. Rises("it is the coil", InputId.Axis(StepDownStage.InductanceAxis), InputId.Column(L1, InductorFamily.Inductance))];
        ImmutableArray<Dependence> capacitance = [.. Rises("it is the capacitor", InputId.Axis(ReservoirCapacitor.CapacitanceAxis(C2)), InputId.Column(C2, CapacitorFamily.Capacitance))];
        ImmutableArray<Dependence> esr =
        [
            .. Rises("it is the ESR", InputId.Axis(ReservoirCapacitor.EsrAxis(C2)), InputId.Column(C2, CapacitorFamily.EsrHigh), InputId.Column(C2, CapacitorFamily.EsrCold)),
            .. Falls("the cold raises it", Surroundings.Air(r)),
        ];
        int Row(string kind, string name, Unit unit, Side side, string key, string equation, ImmutableArray<Dependence> on) =>
            stress(new(U1, kind, name, unit, side, new Bound.Limit(key), equation) { On = on, Others = Push.None });
        _places =
        [
            Row("window-inductance-least", "stable with a coil of at least", Units.Henry, Side.Floor, RegulatorFamily.InductanceMin, "L = L1 (1 − t)", coil),
            Row("window-inductance", "stable with a coil of at most", Units.Henry, Side.Ceiling, RegulatorFamily.InductanceMax, "L = L1 (1 + t)", coil),
            Row("window-capacitance-least", "stable with a capacitor of at least", Units.Farad, Side.Floor, RegulatorFamily.CapacitanceMin, "C = C2, low and aged", capacitance),
            Row("window-capacitance", "stable with a capacitor of at most", Units.Farad, Side.Ceiling, RegulatorFamily.CapacitanceMax, "C = C2, high and new", capacitance),
            Row("window-esr-least", "stable with an ESR of at least", Units.Ohm, Side.Floor, RegulatorFamily.EsrMin, "R = ESR of C2, new and warm", esr),
            Row("window-esr", "stable with an ESR of at most", Units.Ohm, Side.Ceiling, RegulatorFamily.EsrMax, "R = ESR of C2, aged and cold", esr),
        ];
    }

    public void Write(ReadOnlySpan<double> x, Span<double> stresses, StepDownInputs places)
    {
        stresses[_places[0]] = stresses[_places[1]] = places.Inductance(x);
        stresses[_places[2]] = stresses[_places[3]] = places.Capacitance(x);
        stresses[_places[4]] = stresses[_places[5]] = places.Esr(x);
    }
}

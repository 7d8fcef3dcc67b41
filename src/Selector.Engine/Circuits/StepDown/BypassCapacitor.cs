using System.Numerics;
using Selector.Engine.Circuits.Thermal;
using Selector.Engine.Parts.Families;
using Selector.Engine.Quantities;
using Selector.Engine.Supplies;
using static Selector.Engine.Circuits.Dependences;
using static Selector.Engine.Circuits.StepDown.StepDownPositions;

namespace Selector.Engine.Circuits.StepDown;

/// <summary>
/// C3 at the input of U1: of every harmonic of the pulses that U1 draws it takes the share that its impedance leaves to it beside the
/// reservoir. The reservoir itself is rated as if it had to take them all.
/// </summary>
internal sealed class BypassCapacitor
{
    private const string C1 = "C1";
    private const int Harmonics = 24;

    private readonly int _capacitance, _tolerance, _esr, _bias, _rated, _reservoir, _reservoirEsr, _reservoirEsl;
    private readonly int _voltage, _ripple, _temperature;

    public BypassCapacitor(Func<InputId, double?, int> read, Func<StressSpec, int> stress, RequirementValues r)
    {
        int Column(string position, string key, double? fallback = null) => read(InputId.Column(position, key), fallback);
        _capacitance = Column(C3, FilmCapacitorFamily.Capacitance);
        _tolerance = Column(C3, FilmCapacitorFamily.Tolerance, 0.2);
        _esr = Column(C3, FilmCapacitorFamily.Esr, 0);
        _bias = Column(C3, FilmCapacitorFamily.BiasLoss, 0);
        _rated = Column(C3, FilmCapacitorFamily.Voltage, 0);
        _reservoir = Column(C1, CapacitorFamily.Capacitance);
        _reservoirEsr = Column(C1, CapacitorFamily.EsrHigh, 0.05);
        _reservoirEsl = Column(C1, CapacitorFamily.Esl, 20e-9);
        _voltage = stress(new(C3, "voltage", "voltage, ripple peak included", Units.Volt, Side.Ceiling, new Bound.Rating(FilmCapacitorFamily.Voltage), "V = greatest bus voltage")
            { On = [.. Rises("it is the top of the bus", InputId.Link(LinkNames.BusMax))], Others = Push.None });
        _ripple = stress(new(C3, "ripple-current", "switching ripple, rms", Units.Ampere, Side.Ceiling, new Bound.Rating(FilmCapacitorFamily.Ripple),
            "I = √( Σ (I_k |Z1 / (Z1 + Z3)|)² ), I_k the harmonics of the pulses that U1 draws, from the second on at their greatest") );
        var air = Surroundings.Air(r);
        _temperature = stress(new(C3, "temperature", "air at its place", Units.Celsius, Side.Temperature, new Bound.Rating(FilmCapacitorFamily.TemperatureMax), "T = T_air")
            { On = [.. Rises("it is the air around it", air)], Others = Push.None });
    }

    /// <summary>Writes the stresses of C3.</summary>
    /// <param name="x">Inputs of the stage.</param>
    /// <param name="stresses">Of the stage.</param>
    /// <param name="duty">Share of the period for which the switch is on.</param>
    /// <param name="mean">Mean input current, A.</param>
    /// <param name="frequency">Hz.</param>
    /// <param name="busMax">V.</param>
    /// <param name="air">°C.</param>
    public void Write(ReadOnlySpan<double> x, Span<double> stresses, double duty, double mean, double frequency, double busMax, double air)
    {
        var loss = x[_rated] > 0 ? x[_bias] * Math.Min(1, busMax / x[_rated]) : 0;
        var capacitance = x[_capacitance] * (1 + x[_tolerance]) * (1 - loss);
        var height = duty > 1e-6 ? mean / duty : 0;
        var square = 0.0;
        for (var k = 1; k <= Harmonics; k++)
        {
            var omega = 2 * Math.PI * frequency * k;
            // A harmonic that meets the resonance of the two capacitors hangs on the duty by a hair: from the second on its greatest counts.
            var sine = k == 1 ? Math.Sin(Math.PI * duty) : 1;
            var current = Math.Sqrt(2) * height * sine / (k * Math.PI);
            var own = new Complex(x[_esr], -1 / (omega * capacitance));
            var other = new Complex(0.5 * x[_reservoirEsr], omega * x[_reservoirEsl] - 1 / (omega * x[_reservoir]));
            var part = current * Complex.Abs(other) / Math.Max(1e-9, Complex.Abs(own + other));
            square += part * part;
        }

        stresses[_voltage] = busMax;
        stresses[_ripple] = Math.Sqrt(square);
        stresses[_temperature] = air;
    }
}

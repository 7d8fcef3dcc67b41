namespace Selector.Engine.Circuits.StepDown;

/// <summary>
/// Equations of the circuit while switch or diode conducts: a source in series with a resistance and the coil, feeding the
/// output capacitor and the load.
/// </summary>
internal static class DrivenPhase
{
    /// <summary>The phase with <paramref name="source"/> volts behind <paramref name="resistance"/> ohm, winding included.</summary>
    public static LinearPhase Of(in ConverterCase c, double source, double resistance) =>
        c.LoadKind == OutputLoad.Current ? CurrentLoad(c, source, resistance)
        : c.Esl == 0 ? ResistiveLoad(c, source, resistance)
        : ResistiveLoadBesideEsl(c, source, resistance);

    // The load fixes the difference of coil and capacitor current, so both inductances carry the same slope and act as one.
    private static LinearPhase CurrentLoad(in ConverterCase c, double source, double resistance)
    {
        var inductance = c.Inductance + c.Esl;
        var damping = resistance + c.Esr;
        var share = c.Esl / inductance;
        return new()
        {
            Modes = NaturalModes.OfPair(-damping / inductance, 1 / (inductance * c.Capacitance)),
            Rate = new(new(-damping / inductance, -1 / inductance, 0), new(1 / c.Capacitance, 0, 0), default),
            Equilibrium = new(c.Load, source - resistance * c.Load, 0),
            Present = new(1, 1, 0),
            TerminalWeights = new(c.Esr - share * damping, 1 - share, 0),
            TerminalAtEquilibrium = source - resistance * c.Load,
            CapacitorCurrentWeights = new(1, 0, 0),
        };
    }

    private static LinearPhase ResistiveLoad(in ConverterCase c, double source, double resistance)
    {
        var divider = c.Load / (c.Load + c.Esr);
        var damping = resistance + divider * c.Esr;
        var bleed = 1 / (c.Load + c.Esr);
        var current = source / (resistance + c.Load);
        // Expanded by hand: the difference of products would lose the small term.
        var product = (resistance + c.Load) * bleed / (c.Inductance * c.Capacitance);
        return new()
        {
            Modes = NaturalModes.OfPair(-damping / c.Inductance - bleed / c.Capacitance, product),
            Rate = new(
                new(-damping / c.Inductance, -divider / c.Inductance, 0),
                new(divider / c.Capacitance, -bleed / c.Capacitance, 0),
                default),
            Equilibrium = new(current, c.Load * current, 0),
            Present = new(1, 1, 0),
            TerminalWeights = new(divider * c.Esr, divider, 0),
            TerminalAtEquilibrium = c.Load * current,
            CapacitorCurrentWeights = new(divider, -bleed, 0),
        };
    }

    // Coil and capacitor current are independent here; the terminal voltage serves as the third state.
    private static LinearPhase ResistiveLoadBesideEsl(in ConverterCase c, double source, double resistance)
    {
        var esl = c.Esl;
        NaturalModes modes;
        double square;
        var tries = 0;
        while (!CubicModes.TryFind(c, esl, resistance, out modes, out square) && tries++ < 4)
        {
            // A double root that the spectral formula cannot divide by; a change of one part in 1e8 moves off it.
            esl *= 1 + 1e-8;
        }

        var rate = new StateMatrix(
            new(-resistance / c.Inductance, 0, -1 / c.Inductance),
            new(1 / c.Capacitance, 0, -1 / (c.Load * c.Capacitance)),
            new(
                c.Load * (c.Esr / esl - resistance / c.Inductance),
                c.Load / esl,
                -c.Load / c.Inductance - (c.Load + c.Esr) / esl));
        var sum = 2 * modes.Decay;
        var product = modes.Square + modes.Decay * modes.Decay;
        var fastPart = 1 / square * (rate * rate - sum * rate + product * StateMatrix.Identity);
        var current = source / (resistance + c.Load);
        return new()
        {
            Modes = modes,
            Rate = rate,
            FastPart = fastPart,
            Equilibrium = new(current, c.Load * current, c.Load * current),
            Present = new(1, 1, 1),
            TerminalWeights = new(0, 0, 1),
            TerminalAtEquilibrium = c.Load * current,
            CapacitorCurrentWeights = new(1, 0, -1 / c.Load),
        };
    }
}

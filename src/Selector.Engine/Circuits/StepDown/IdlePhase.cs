namespace Selector.Engine.Circuits.StepDown;

/// <summary>Equations of the circuit while the coil is currentless: the capacitor alone feeds the load.</summary>
internal static class IdlePhase
{
    public static LinearPhase Of(in ConverterCase c) =>
        c.LoadKind == OutputLoad.Current ? CurrentLoad(c)
        : c.Esl == 0 ? ResistiveLoad(c)
        : ResistiveLoadBesideEsl(c);

    private static LinearPhase CurrentLoad(in ConverterCase c) => new()
    {
        Drift = new(0, -c.Load / c.Capacitance, 0),
        Present = new(0, 1, 0),
        TerminalWeights = new(0, 1, 0),
        TerminalAtEquilibrium = -c.Esr * c.Load,
        CapacitorCurrentAtEquilibrium = -c.Load,
    };

    private static LinearPhase ResistiveLoad(in ConverterCase c)
    {
        var bleed = 1 / (c.Load + c.Esr);
        var rate = -bleed / c.Capacitance;
        return new()
        {
            Modes = new(rate, 0, 0, 0),
            Rate = new(default, new(0, rate, 0), default),
            FastPart = new(default, new(0, 1, 0), default),
            Present = new(0, 1, 0),
            TerminalWeights = new(0, c.Load * bleed, 0),
            CapacitorCurrentWeights = new(0, -bleed, 0),
        };
    }

    private static LinearPhase ResistiveLoadBesideEsl(in ConverterCase c) => new()
    {
        Modes = NaturalModes.OfPair(-(c.Load + c.Esr) / c.Esl, 1 / (c.Esl * c.Capacitance)),
        Rate = new(
            default,
            new(0, 0, -1 / (c.Load * c.Capacitance)),
            new(0, c.Load / c.Esl, -(c.Load + c.Esr) / c.Esl)),
        Present = new(0, 1, 1),
        TerminalWeights = new(0, 0, 1),
        CapacitorCurrentWeights = new(0, 0, -1 / c.Load),
    };
}

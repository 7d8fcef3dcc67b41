namespace Selector.Engine.Circuits.StepDown;

/// <summary>Integrals (A s, A² s, V s, V² s) and extremes (A, V) over one interval between switching instants.</summary>
internal struct IntervalFigures
{
    public double Coil, CoilSquare, CapacitorSquare, Terminal, TerminalSquare;

    public double CoilMinimum, CoilMaximum, TerminalMinimum, TerminalMaximum;

    /// <summary>No time, and extremes that any value replaces.</summary>
    public static IntervalFigures None => new()
    {
        CoilMinimum = double.PositiveInfinity,
        CoilMaximum = double.NegativeInfinity,
        TerminalMinimum = double.PositiveInfinity,
        TerminalMaximum = double.NegativeInfinity,
    };

    public void Touch(double coil, double terminal)
    {
        CoilMinimum = Math.Min(CoilMinimum, coil);
        CoilMaximum = Math.Max(CoilMaximum, coil);
        TerminalMinimum = Math.Min(TerminalMinimum, terminal);
        TerminalMaximum = Math.Max(TerminalMaximum, terminal);
    }

    public void Weigh(double weight, double coil, double terminal, double capacitor)
    {
        Coil += weight * coil;
        CoilSquare += weight * coil * coil;
        CapacitorSquare += weight * capacitor * capacitor;
        Terminal += weight * terminal;
        TerminalSquare += weight * terminal * terminal;
    }
}

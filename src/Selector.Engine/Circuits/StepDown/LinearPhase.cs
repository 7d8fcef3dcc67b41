namespace Selector.Engine.Circuits.StepDown;

/// <summary>
/// The circuit between two switching instants, solved in closed form: x(t) = e + exp(A t) (x(0) - e), with the exponential by
/// the spectral formula over <see cref="NaturalModes"/>. Where no equilibrium e exists (the capacitor alone feeds a constant
/// current) the state drifts in a straight line.
/// </summary>
internal readonly struct LinearPhase
{
    /// <summary>Natural frequencies.</summary>
    public NaturalModes Modes { get; init; }

    /// <summary>A, in 1/s and the state's units.</summary>
    public StateMatrix Rate { get; init; }

    /// <summary>Projector on the fast mode; zero where there is none.</summary>
    public StateMatrix FastPart { get; init; }

    /// <summary>The state at which nothing changes.</summary>
    public StateVector Equilibrium { get; init; }

    /// <summary>Rate of change without equilibrium; zero otherwise.</summary>
    public StateVector Drift { get; init; }

    /// <summary>Which states exist in this phase: 1 or 0 each.</summary>
    public StateVector Present { get; init; }

    /// <summary>Terminal voltage and capacitor current as weights on x - e, plus their values at e.</summary>
    public StateVector TerminalWeights { get; init; }

    public StateVector CapacitorCurrentWeights { get; init; }

    public double TerminalAtEquilibrium { get; init; }

    public double CapacitorCurrentAtEquilibrium { get; init; }

    /// <summary>The state after <paramref name="t"/> seconds as matrix x(0) + offset.</summary>
    public void Transition(double t, out StateMatrix matrix, out StateVector offset)
    {
        var m = Modes.At(t);
        var pair = StateMatrix.Identity - FastPart;
        var full = m.Fast * FastPart + (m.Even - Modes.Decay * m.Odd) * pair + m.Odd * (Rate * pair);
        matrix = new(
            Present.Coil * full.Row1, Present.Capacitor * full.Row2, Present.Terminal * full.Row3);
        offset = Equilibrium - matrix * Equilibrium + t * Drift;
    }

    /// <summary>Coil current, terminal voltage and capacitor current from the state at the start of the phase.</summary>
    public void Signals(
        in StateVector start, out ModalSignal coil, out ModalSignal terminal, out ModalSignal capacitorCurrent)
    {
        var deviation = start - Equilibrium;
        var fast = FastPart * deviation;
        var even = deviation - fast;
        var odd = Rate * even - Modes.Decay * even + Drift;
        coil = new(Equilibrium.Coil, fast.Coil, even.Coil, odd.Coil);
        terminal = Read(TerminalWeights, TerminalAtEquilibrium, fast, even, odd);
        capacitorCurrent = Read(CapacitorCurrentWeights, CapacitorCurrentAtEquilibrium, fast, even, odd);
    }

    private static ModalSignal Read(
        in StateVector weights, double constant, in StateVector fast, in StateVector even, in StateVector odd) =>
        new(constant, weights.Dot(fast), weights.Dot(even), weights.Dot(odd));
}

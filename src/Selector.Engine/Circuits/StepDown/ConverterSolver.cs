namespace Selector.Engine.Circuits.StepDown;

/// <summary>
/// Exact periodic steady state of the step-down converter, by state transition in closed form. Conventions of the reference
/// family F3; agrees with circuit simulation to its own numerical error, about one part in 1e4 in the worst column.
/// </summary>
public static partial class ConverterSolver
{
    /// <summary>
    /// Solves at the duty that the case states. BadInput: a field outside its range, or a circuit that rings more than about
    /// three hundred times between two switching instants. NoOperatingPoint: the switch drop or the load leaves no positive
    /// output voltage, or the diode would have to carry current backwards or take over while the coil rests (an output that swings
    /// below ground). A zero current load charges the
    /// output to the peak of the switch node and lets no current flow.
    /// </summary>
    public static SolveStatus Solve(in ConverterCase c, in Budget budget, out ConverterSolution solution)
    {
        solution = default;
        if (!c.PartsAreInRange || !c.DutyIsInRange)
        {
            return SolveStatus.BadInput;
        }

        if (budget.Cancel.IsCancellationRequested)
        {
            return SolveStatus.Cancelled;
        }

        if (c.InputVoltage <= c.SwitchDrop)
        {
            return SolveStatus.NoOperatingPoint;
        }

        if (c.LoadKind == OutputLoad.Current && c.Load == 0)
        {
            solution = Unloaded(c, c.InputVoltage - c.SwitchDrop);
            return SolveStatus.Solved;
        }

        var phases = new ConverterPhases(c);
        var status = PeriodicState.Find(c, phases, c.Duty, budget, out var orbit);
        return status == SolveStatus.Solved ? Describe(c, phases, orbit, out solution) : status;
    }

    /// <summary>Nothing flows: the output holds a voltage, and the switch node floats at it.</summary>
    private static ConverterSolution Unloaded(in ConverterCase c, double output) => new()
    {
        Mode = ConductionMode.Discontinuous,
        IdleFraction = 1,
        OutputMean = output,
        OutputMaximum = output,
        OutputMinimum = output,
        DiodeReverseMaximum = output,
        SwitchOffMaximum = c.InputVoltage - output,
    };

    private static SolveStatus Describe(
        in ConverterCase c, in ConverterPhases phases, in PeriodicOrbit orbit, out ConverterSolution solution)
    {
        solution = default;
        var on = IntervalFigures.None;
        var diode = IntervalFigures.None;
        var idle = IntervalFigures.None;
        if (!IntervalSweep.Add(phases.On, orbit.AtTurnOn, orbit.OnTime, ref on)
            || !IntervalSweep.Add(phases.Diode, orbit.AtTurnOff, orbit.DiodeTime, ref diode)
            || !IntervalSweep.Add(phases.Idle, orbit.AtDiodeEnd with { Coil = 0 }, orbit.IdleTime, ref idle))
        {
            return SolveStatus.BadInput;
        }

        var s = SolutionOf(c, phases, orbit, on, diode, idle);
        // Ideal branches conduct both ways in the equations; real ones do not, so such a solution is none.
        var slack = 1e-6 * s.CoilPeak;
        var blocked = diode.CoilMinimum < -slack
            || phases.OnSource - c.SwitchResistance * on.CoilMaximum < -c.DiodeThreshold
            || idle.TerminalMinimum < -c.DiodeThreshold
            || !(s.OutputMean > 0);
        if (!s.IsFinite)
        {
            return SolveStatus.BadInput;
        }

        if (blocked)
        {
            return SolveStatus.NoOperatingPoint;
        }

        solution = s;
        return SolveStatus.Solved;
    }
}

namespace Selector.Engine.Circuits.StepDown;

// The inverse problem: which duty a regulator settles at.
public static partial class ConverterSolver
{
    /// <summary>
    /// Finds the duty for a mean output voltage of <paramref name="outputMean"/> volts (above 0, at most 1e5) at the capacitor's
    /// terminals; the duty of the case is not read. The mean rises with the duty as long as
    /// the output ripple stays below about a tenth of it, and the answer is then the only one.
    /// NoOperatingPoint: the duty would exceed <paramref name="maxDuty"/> (above 0, at most 1), that is, the input is too low.
    /// A zero current load needs no duty: 0, without ripple, is the answer. A <paramref name="dutyGuess"/> from a neighbouring
    /// case saves work and does not change the result beyond rounding. Otherwise as <see cref="Solve"/>.
    /// </summary>
    public static SolveStatus SolveForOutput(
        in ConverterCase withoutDuty, double outputMean, in Budget budget, out double duty, out ConverterSolution solution,
        double maxDuty = 1, double dutyGuess = double.NaN)
    {
        duty = 0;
        solution = default;
        var c = withoutDuty;
        if (!c.PartsAreInRange || !(outputMean > 0 && outputMean <= 1e5) || !(maxDuty > 0 && maxDuty <= 1))
        {
            return SolveStatus.BadInput;
        }

        if (budget.Cancel.IsCancellationRequested)
        {
            return SolveStatus.Cancelled;
        }

        if (outputMean >= c.InputVoltage - c.SwitchDrop)
        {
            return SolveStatus.NoOperatingPoint;
        }

        if (c.LoadKind == OutputLoad.Current && c.Load == 0)
        {
            solution = Unloaded(c, outputMean);
            return SolveStatus.Solved;
        }

        var phases = new ConverterPhases(c);
        var search = new OutputError(c, phases, outputMean, budget);
        var averaged = AveragedLaw.Duty(c, outputMean, out search.FirstSlope);
        var guess = dutyGuess > 0 && dutyGuess < maxDuty ? dutyGuess : averaged;
        if (!(guess > 0 && guess < maxDuty))
        {
            // Only where the averaged law finds no duty is the greatest one worth a solution of its own.
            var error = search.At(maxDuty, out _);
            if (search.Status != SolveStatus.Solved)
            {
                return search.Status;
            }

            if (error < 0)
            {
                return SolveStatus.NoOperatingPoint;
            }

            search.FirstSlope = double.NaN;
            guess = maxDuty - 1e-3 * maxDuty;
        }

        var status = BracketedRoot.Find(
            ref search, 0, maxDuty, -1, guess, 1e-15, 1e-11 * outputMean, budget, out var found);
        if (search.Status != SolveStatus.Solved || status != SolveStatus.Solved)
        {
            return search.Status != SolveStatus.Solved ? search.Status : status;
        }

        // A root pressed against the end of the bracket is the sign that the output is out of reach.
        if (!(Math.Abs(search.LastError) <= 1e-6 * outputMean))
        {
            return SolveStatus.NoOperatingPoint;
        }

        status = Describe(c with { Duty = found }, phases, search.Orbit, out solution);
        duty = status == SolveStatus.Solved ? found : 0;
        return status;
    }

    /// <summary>Mean output less the wanted one, as a function of duty.</summary>
    private struct OutputError(in ConverterCase c, in ConverterPhases phases, double wanted, in Budget budget) : IRootFunction
    {
        private readonly ConverterCase c = c;
        private readonly ConverterPhases phases = phases;
        private readonly Budget budget = budget;

        public double FirstSlope = double.NaN;
        public double LastError = double.NaN;
        public PeriodicOrbit Orbit = default;
        public SolveStatus Status = SolveStatus.Solved;

        public double At(double x, out double slope)
        {
            // The averaged slope starts the search; from the second point on the secant knows better.
            slope = FirstSlope;
            FirstSlope = double.NaN;
            Status = PeriodicState.Find(c, phases, x, budget, out Orbit);
            LastError = Status == SolveStatus.Solved ? PeriodicState.OutputMean(c, phases, Orbit) - wanted : double.NaN;
            return LastError;
        }
    }
}

using Selector.Engine.Circuits;

namespace Selector.Engine.Supplies;

/// <summary>
/// Solves a whole supply at one condition: runs the stages in the order of the signal path and closes the loops among them
/// (converter input with bus, loss with temperature) to a fixed point. Not for several threads at once; cheap to make.
/// </summary>
public sealed class SupplySolver
{
    private const int MostSweeps = 60;

    /// <summary>Relative residual of the loops within which a condition is solved.</summary>
    private const double LinkTolerance = 1e-6;

    /// <summary>Relative residual from which one more step lands within the tolerance, as a rule; the last sweep makes sure.</summary>
    private const double Near = 5e-5;

    private const double Damping = 0.5;

    private readonly SupplyModel _model;
    private readonly double[][] _inputs;
    private readonly double[] _before;
    private readonly int[] _loop;
    private readonly double[] _residual;
    private readonly LoopSteps _steps;

    /// <param name="model">The stages, wired.</param>
    /// <param name="fittings">Parts by position; an empty position is solved with the stage's stand-in.</param>
    public SupplySolver(SupplyModel model, IReadOnlyDictionary<string, Fitting> fittings)
    {
        _model = model;
        _loop = [.. model.Wiring.Loop];
        _before = new double[_loop.Length];
        _residual = new double[_loop.Length];
        _steps = new LoopSteps(_loop.Length);
        _inputs = new double[model.Stages.Length][];
        for (var stage = 0; stage < model.Stages.Length; stage++)
        {
            _inputs[stage] = [.. model.Wiring.Inputs(stage).Select(source => Constant(source, fittings))];
        }
    }

    /// <summary>Solves at one condition.</summary>
    /// <param name="axes">A value for every axis of the model.</param>
    /// <param name="links">Written; on entry the start, for example the solution of a neighbouring condition.</param>
    /// <param name="stresses">Written when solved.</param>
    /// <param name="budget">Bound on work.</param>
    public SolveStatus Solve(ReadOnlySpan<double> axes, Span<double> links, Span<double> stresses, in Budget budget)
    {
        _steps.Begin();
        var status = Close(axes, links, stresses, false, budget);
        if (status is SolveStatus.Solved or SolveStatus.Cancelled)
        {
            return status;
        }

        // A step, or a neighbour's solution, may lie across a collapse. Creeping up from a lightly loaded bus finds the operating
        // point that a charged supply settles at, if there is one.
        _steps.Forget();
        Start(links);
        return Close(axes, links, stresses, true, budget);
    }

    private SolveStatus Close(ReadOnlySpan<double> axes, Span<double> links, Span<double> stresses, bool creeping, in Budget budget)
    {
        var last = false;
        for (var sweep = 0; sweep < MostSweeps; sweep++)
        {
            if (budget.Cancel.IsCancellationRequested)
            {
                return SolveStatus.Cancelled;
            }

            for (var i = 0; i < _loop.Length; i++)
            {
                _before[i] = links[_loop[i]];
            }

            var status = Sweep(axes, links, last ? stresses : [], budget);
            if (status != SolveStatus.Solved)
            {
                return status;
            }

            var residual = Residual(links);
            if (last && residual <= LinkTolerance)
            {
                return SolveStatus.Solved;
            }

            if (creeping)
            {
                Damp(links);
            }
            else
            {
                Step(links);
            }

            last = residual <= (creeping ? LinkTolerance : Near);
        }

        return SolveStatus.OutOfBudget;
    }

    private double Residual(ReadOnlySpan<double> links)
    {
        var greatest = 0.0;
        for (var i = 0; i < _loop.Length; i++)
        {
            _residual[i] = (links[_loop[i]] - _before[i]) / Scale(i);
            greatest = Math.Max(greatest, Math.Abs(_residual[i]));
        }

        return greatest;
    }

    /// <summary>Links differ in size by unit; each is weighed by its own value, or by its usual one when it is near zero.</summary>
    private double Scale(int i) => Math.Max(Math.Abs(_before[i]), Math.Max(0.5 * Math.Abs(_model.Links[_loop[i]].Start), 1e-3));

    private void Step(Span<double> links)
    {
        var step = _steps.Next(_residual);
        for (var i = 0; i < _loop.Length; i++)
        {
            links[_loop[i]] = _before[i] + step[i] * Scale(i);
        }
    }

    /// <summary>First guesses of all links.</summary>
    public void Start(Span<double> links)
    {
        for (var i = 0; i < links.Length; i++)
        {
            links[i] = _model.Links[i].Start;
        }
    }

    private SolveStatus Sweep(ReadOnlySpan<double> axes, Span<double> links, Span<double> stresses, in Budget budget)
    {
        var firstStress = 0;
        for (var stage = 0; stage < _model.Stages.Length; stage++)
        {
            var spec = _model.Stages[stage];
            var own = stresses.IsEmpty ? [] : stresses.Slice(firstStress, spec.Stresses.Length);
            firstStress += spec.Stresses.Length;
            if (spec.OnDemand)
            {
                own.Fill(double.NaN);
                continue;
            }

            var status = spec.Solve(Inputs(stage, axes, links), links.Slice(_model.Wiring.FirstLink(stage), spec.Writes.Length), own, budget);
            if (status != SolveStatus.Solved)
            {
                return status;
            }

            if (!AllFinite(own))
            {
                return SolveStatus.BadInput;
            }
        }

        return AllFinite(links) ? SolveStatus.Solved : SolveStatus.BadInput;
    }

    /// <summary>Fills in the stresses of a stage that is solved on demand, at a condition that is solved otherwise.</summary>
    /// <param name="stage">Which.</param>
    /// <param name="axes">Of the condition.</param>
    /// <param name="links">Of the condition; not written.</param>
    /// <param name="stresses">All of the condition; those of the stage are written, as negative infinity where it has no solution.</param>
    /// <param name="budget">Bound on work.</param>
    public SolveStatus Fill(int stage, ReadOnlySpan<double> axes, Span<double> links, Span<double> stresses, in Budget budget)
    {
        var first = 0;
        for (var s = 0; s < stage; s++)
        {
            first += _model.Stages[s].Stresses.Length;
        }

        var own = stresses.Slice(first, _model.Stages[stage].Stresses.Length);
        var status = _model.Stages[stage].Solve(Inputs(stage, axes, links), [], own, budget);
        status = status == SolveStatus.Solved && !AllFinite(own) ? SolveStatus.BadInput : status;
        if (status != SolveStatus.Solved)
        {
            own.Fill(double.NegativeInfinity);
        }

        return status;
    }

    private double[] Inputs(int stage, ReadOnlySpan<double> axes, ReadOnlySpan<double> links)
    {
        var inputs = _inputs[stage];
        var sources = _model.Wiring.Inputs(stage);
        for (var i = 0; i < inputs.Length; i++)
        {
            inputs[i] = sources[i].Kind switch
            {
                InputKind.Axis => axes[sources[i].Index],
                InputKind.Link => links[sources[i].Index],
                _ => inputs[i],
            };
        }

        return inputs;
    }

    private void Damp(Span<double> links)
    {
        for (var i = 0; i < _loop.Length; i++)
        {
            links[_loop[i]] = _before[i] + Damping * (links[_loop[i]] - _before[i]);
        }
    }

    private static bool AllFinite(ReadOnlySpan<double> values)
    {
        foreach (var v in values)
        {
            if (!double.IsFinite(v))
            {
                return false;
            }
        }

        return true;
    }

    /// <summary>What does not change from condition to condition: the rating, else its fallback, else the stand-in.</summary>
    private double Constant(InputSource source, IReadOnlyDictionary<string, Fitting> fittings)
    {
        if (source.Kind is not (InputKind.Column or InputKind.Count))
        {
            return 0;
        }

        var position = _model.Positions[source.Index];
        var fitting = fittings.GetValueOrDefault(position.Id);
        if (source.Kind == InputKind.Count)
        {
            return fitting?.Count ?? 1;
        }

        var key = _model.FamilyOf(position).Ratings[source.Column].Key;
        if (fitting?.Rating(key) is { } rating && !double.IsNaN(rating))
        {
            return rating;
        }

        var standIn = position.StandIn.GetValueOrDefault(key, double.NaN);
        return fitting is null && !double.IsNaN(standIn) ? standIn
            : !double.IsNaN(source.Fallback) ? source.Fallback
            : !double.IsNaN(standIn) ? standIn
            : throw new InvalidOperationException($"{position.Id} has neither a fallback nor a stand-in for '{key}'.");
    }
}

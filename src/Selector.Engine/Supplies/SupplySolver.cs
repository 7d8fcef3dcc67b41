using Selector.Engine.Circuits;

namespace Selector.Engine.Supplies;

/// <summary>
/// Solves a whole supply at one condition: runs the stages in the order of the signal path and closes the loops among them
/// (converter input with bus, loss with temperature) to a fixed point. Not for several threads at once; cheap to make.
/// </summary>
public sealed class SupplySolver
{
    private const int MostSweeps = 60;
    private const double LinkTolerance = 1e-7;

    /// <summary>Sweeps by plain substitution before a loop that does not settle is left unaccelerated for good.</summary>
    private const int TrustedSweeps = 30;

    private const double Damping = 0.5;

    private readonly SupplyModel _model;
    private readonly double[][] _inputs;
    private readonly double[] _before;
    private readonly int[] _loop;
    private readonly LoopAcceleration _acceleration;

    /// <param name="model">The stages, wired.</param>
    /// <param name="fittings">Parts by position; an empty position is solved with the stage's stand-in.</param>
    public SupplySolver(SupplyModel model, IReadOnlyDictionary<string, Fitting> fittings)
    {
        _model = model;
        _before = new double[model.Links.Length];
        _loop = [.. Enumerable.Range(0, model.Links.Length).Where(i => !model.Links[i].IsHint)];
        _acceleration = new LoopAcceleration(_loop);
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
        var status = Close(axes, links, stresses, true, budget);
        if (status is SolveStatus.Solved or SolveStatus.Cancelled)
        {
            return status;
        }

        // A combination of sweeps, or a neighbour's solution, may lie across a collapse. Creeping up from a lightly loaded bus
        // finds the operating point that a charged supply settles at, if there is one.
        Start(links);
        return Close(axes, links, stresses, false, budget);
    }

    private SolveStatus Close(ReadOnlySpan<double> axes, Span<double> links, Span<double> stresses, bool accelerated, in Budget budget)
    {
        _acceleration.Restart();
        for (var sweep = 0; sweep < MostSweeps; sweep++)
        {
            if (budget.Cancel.IsCancellationRequested)
            {
                return SolveStatus.Cancelled;
            }

            links.CopyTo(_before);
            var status = Sweep(axes, links, [], budget);
            if (status != SolveStatus.Solved)
            {
                return status;
            }

            if (Settled(links))
            {
                return Sweep(axes, links, stresses, budget);
            }

            if (!accelerated)
            {
                Damp(links);
            }
            else if (sweep < TrustedSweeps)
            {
                _acceleration.Next(_before, links);
            }
        }

        return SolveStatus.OutOfBudget;
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

            var own = stresses.IsEmpty ? [] : stresses.Slice(firstStress, spec.Stresses.Length);
            var status = spec.Solve(inputs, links.Slice(_model.Wiring.FirstLink(stage), spec.Writes.Length), own, budget);
            if (status != SolveStatus.Solved)
            {
                return status;
            }

            firstStress += spec.Stresses.Length;
        }

        return AllFinite(links) && AllFinite(stresses) ? SolveStatus.Solved : SolveStatus.BadInput;
    }

    private void Damp(Span<double> links)
    {
        foreach (var i in _loop)
        {
            links[i] = _before[i] + Damping * (links[i] - _before[i]);
        }
    }

    private bool Settled(ReadOnlySpan<double> links)
    {
        foreach (var i in _loop)
        {
            if (Math.Abs(links[i] - _before[i]) > LinkTolerance * Math.Max(Math.Abs(links[i]), 1e-3))
            {
                return false;
            }
        }

        return true;
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

        if (fitting is not null && fitting.Part.Ratings[source.Column] is var rating && !double.IsNaN(rating))
        {
            return rating;
        }

        if (!double.IsNaN(source.Fallback))
        {
            return source.Fallback;
        }

        var key = _model.FamilyOf(position).Ratings[source.Column].Key;
        return position.StandIn.TryGetValue(key, out var standIn)
            ? standIn
            : throw new InvalidOperationException($"{position.Id} has neither a fallback nor a stand-in for '{key}'.");
    }
}

using System.Collections.Immutable;
using Selector.Engine.Circuits;

namespace Selector.Engine.Supplies;

/// <summary>
/// Directions followed from the axes through the links to the stresses, and which ratings a stress rests on. Two ways that
/// disagree, or one that is not proven, make the whole unproven: the axis is then searched.
/// </summary>
internal sealed class Directions
{
    private readonly Push[,] _links;
    private readonly Push[,] _stresses;
    private readonly HashSet<(int Position, int Column)>[] _ratings;

    public Directions(SupplyModel model)
    {
        var axes = model.Axes.Length;
        _links = new Push[model.Links.Length, axes];
        _stresses = new Push[model.Stresses.Length, axes];
        var linkRatings = NewSets(model.Links.Length);
        _ratings = NewSets(model.Stresses.Length);

        // A lattice of height two: each sweep can only raise an entry, so the sweeps end.
        for (var changed = true; changed;)
        {
            changed = false;
            for (var stage = 0; stage < model.Stages.Length; stage++)
            {
                var first = model.Wiring.FirstLink(stage);
                for (var i = 0; i < model.Stages[stage].Writes.Length; i++)
                {
                    changed |= Follow(model, stage, [.. model.Stages[stage].Writes[i].On], model.Stages[stage].Writes[i].Others, _links, first + i, linkRatings, linkRatings[first + i]);
                }
            }
        }

        for (var i = 0; i < model.Stresses.Length; i++)
        {
            Follow(model, model.Stresses[i].Stage, model.Stresses[i].Spec.On, model.Stresses[i].Spec.Others, _stresses, i, linkRatings, _ratings[i]);
        }
    }

    /// <summary>Direction of a stress in an axis; None when the axis does not bear on it.</summary>
    public Push OfStress(int stress, int axis) => _stresses[stress, axis];

    /// <summary>Direction of a link in an axis.</summary>
    public Push OfLink(int link, int axis) => _links[link, axis];

    /// <summary>Ratings on which the value of a stress rests, by position and column.</summary>
    public IReadOnlySet<(int Position, int Column)> RatingsOf(int stress) => _ratings[stress];

    /// <summary>Direction by way of two steps.</summary>
    internal static Push Then(Push first, Push second) =>
        first == Push.None || second == Push.None ? Push.None
        : first == Push.Unproven || second == Push.Unproven ? Push.Unproven
        : (Push)((sbyte)first * (sbyte)second);

    /// <summary>Direction by either of two ways.</summary>
    internal static Push Join(Push one, Push other) =>
        one == Push.None ? other : other == Push.None || one == other ? one : Push.Unproven;

    private bool Follow(
        SupplyModel model, int stage, ImmutableArray<Dependence> on, Push others, Push[,] table, int row,
        HashSet<(int, int)>[] linkRatings, HashSet<(int, int)> ratings)
    {
        var changed = false;
        var sources = model.Wiring.Inputs(stage);
        for (var i = 0; i < sources.Length; i++)
        {
            var push = Stated(on, others, model.Stages[stage].Inputs[i].Id);
            if (push == Push.None)
            {
                continue;
            }

            var source = sources[i];
            switch (source.Kind)
            {
                case InputKind.Axis:
                    changed |= Raise(table, row, source.Index, push);
                    break;
                case InputKind.Link:
                    for (var axis = 0; axis < model.Axes.Length; axis++)
                    {
                        changed |= Raise(table, row, axis, Then(push, _links[source.Index, axis]));
                    }

                    var before = ratings.Count;
                    ratings.UnionWith(linkRatings[source.Index]);
                    changed |= ratings.Count != before;
                    break;
                case InputKind.Column:
                    changed |= ratings.Add((source.Index, source.Column));
                    break;
                case InputKind.Count:
                    break;
            }
        }

        return changed;
    }

    private static bool Raise(Push[,] table, int row, int axis, Push push)
    {
        var joined = Join(table[row, axis], push);
        var changed = joined != table[row, axis];
        table[row, axis] = joined;
        return changed;
    }

    private static Push Stated(ImmutableArray<Dependence> on, Push others, InputId input)
    {
        foreach (var d in on)
        {
            if (d.Input == input)
            {
                return d.Push;
            }
        }

        return others;
    }

    private static HashSet<(int, int)>[] NewSets(int count) => [.. Enumerable.Range(0, count).Select(_ => new HashSet<(int, int)>())];
}

using System.Collections.Immutable;
using Selector.Engine.Corners;
using Selector.Engine.Supplies;

namespace Selector.Engine.Circuits;

/// <summary>
/// A stage of the circuit. It declares what it needs and gives, and nothing else in the program knows it: to add one, add a
/// folder with a class of this kind and register it.
/// </summary>
public interface IStage
{
    /// <summary>Lower case, hyphens.</summary>
    string Id { get; }

    /// <summary>As printed.</summary>
    string Name { get; }

    /// <summary>The stage's part of the requirement; form, file and interface come from it.</summary>
    ImmutableArray<FieldSpec> Fields { get; }

    /// <summary>What must hold among several fields.</summary>
    ImmutableArray<FieldCheck> Checks { get; }

    /// <summary>Whether the requirement asks for this stage.</summary>
    bool Applies(RequirementValues requirement);

    /// <summary>The stage for one requirement. Only called when it applies and the requirement has no faults.</summary>
    /// <param name="requirement">Read and without faults.</param>
    /// <param name="before">Stages registered before this one that apply too; their heat is what a thermal stage gathers.</param>
    StageModel Build(RequirementValues requirement, ImmutableArray<StageModel> before);
}

/// <summary>
/// A stage as one requirement makes it: immutable once built, shared by threads. A derived class declares its inputs, links and
/// stresses in its constructor and keeps the places that the declarations return; its solver reads and writes by them.
/// </summary>
public abstract class StageModel
{
    /// <summary>Places to fill, in the order of the signal path.</summary>
    public ImmutableArray<PositionSpec> Positions { get; protected init; } = [];

    /// <summary>Worst-case axes that the stage brings in.</summary>
    public ImmutableArray<AxisSpec> Axes { get; protected init; } = [];

    /// <summary>What the solver reads, in this order.</summary>
    public ImmutableArray<InputSpec> Inputs { get; private set; } = [];

    /// <summary>What the solver writes for other stages, in this order.</summary>
    public ImmutableArray<LinkSpec> Writes { get; private set; } = [];

    /// <summary>What the solver writes for the ledger, in this order.</summary>
    public ImmutableArray<StressSpec> Stresses { get; private set; } = [];

    /// <summary>What the stage leaves out.</summary>
    public ImmutableArray<NotAssessed> NotAssessed { get; protected init; } = [];

    /// <summary>Heat that leaves parts of the stage, for the thermal stage.</summary>
    public ImmutableArray<HeatSource> Heats { get; protected init; } = [];

    /// <summary>Heat of parts that have no junction: it only warms the air in the case.</summary>
    public ImmutableArray<LossLink> OtherLosses { get; protected init; } = [];

    /// <summary>What is drawn, plotted, measured and warned of.</summary>
    public StageView View { get; protected init; } = StageView.Empty;

    /// <summary>
    /// Dear to solve, and no other stage reads it: asked only at the conditions where one of its own stresses may be worst. It may
    /// write no links.
    /// </summary>
    public bool OnDemand { get; protected init; }

    /// <summary>Relative error of the solver: two computations of one supply that differ by less agree.</summary>
    public double Error { get; protected init; } = 1e-6;

    /// <summary>Solves the stage at one condition. Must write every link and stress, all finite, when it returns Solved.</summary>
    /// <param name="inputs">In the order of <see cref="Inputs"/>; finite.</param>
    /// <param name="links">In the order of <see cref="Writes"/>; on entry the last values, as a start.</param>
    /// <param name="stresses">In the order of <see cref="Stresses"/>; empty while the loops among stages are being closed.</param>
    /// <param name="budget">Bound on work.</param>
    public abstract SolveStatus Solve(ReadOnlySpan<double> inputs, Span<double> links, Span<double> stresses, in Budget budget);

    /// <summary>Declares an input; returns its place.</summary>
    protected int Read(InputId id, double? fallback = null)
    {
        Inputs = Inputs.Add(new InputSpec(id, fallback));
        return Inputs.Length - 1;
    }

    /// <summary>Declares a link; returns its place.</summary>
    protected int Write(LinkSpec link)
    {
        Writes = Writes.Add(link);
        return Writes.Length - 1;
    }

    /// <summary>Declares a stress; returns its place.</summary>
    protected int Stress(StressSpec stress)
    {
        Stresses = Stresses.Add(stress);
        return Stresses.Length - 1;
    }
}

/// <summary>A part with a junction that heats up.</summary>
/// <param name="Position">Which.</param>
/// <param name="LossLink">Link with its loss in watts, in one part.</param>
/// <param name="TemperatureLink">Link that the thermal stage writes: its junction temperature in °C.</param>
/// <param name="ResistanceKey">Rating with its thermal resistance to open air in K/W.</param>
/// <param name="LimitKey">Rating with its greatest junction temperature in °C.</param>
/// <param name="Needs">Ratings without which the loss is only partly known.</param>
public sealed record HeatSource(string Position, string LossLink, string TemperatureLink, string ResistanceKey, string LimitKey, params Need[] Needs)
{
    /// <summary>Rating with its thermal resistance from junction to case in K/W; null for a part that cannot be bolted to a sink.</summary>
    public string? CaseKey { get; init; }

    /// <summary>Equal parts in the position.</summary>
    public int Quantity { get; init; } = 1;

    /// <summary>Link with how fast the loss grows with the junction, W/K; null where it does not.</summary>
    public string? SlopeLink { get; init; }
}

/// <summary>Heat that warms the case.</summary>
/// <param name="Link">Its link, W, in one part.</param>
/// <param name="Quantity">Equal parts.</param>
public sealed record LossLink(string Link, int Quantity = 1);

/// <summary>What a stage shows besides its numbers.</summary>
/// <param name="Cautions">Plain sentences for page and paper.</param>
public sealed record StageView(ImmutableArray<string> Cautions)
{
    public static StageView Empty { get; } = new([]);
}

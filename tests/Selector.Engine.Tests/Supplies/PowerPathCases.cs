using Selector.Engine.Circuits;
using Selector.Engine.Parts;
using Selector.Engine.Parts.Families;
using Selector.Engine.Supplies;
using Selector.Engine.Tests.Support;

namespace Selector.Engine.Tests.Supplies;

/// <summary>Practice cases and facts of the trade that a whole supply must meet.</summary>
public class PowerPathCases
{
    private static Part Linear { get; } = TestPart.Of(LinearRegulatorFamily.Spec, "LIN",
        (LinearRegulatorFamily.InputMax, 60), (LinearRegulatorFamily.DifferentialMax, 60), (LinearRegulatorFamily.OutputMin, 1.2), (LinearRegulatorFamily.OutputMax, 40),
        (LinearRegulatorFamily.OutputCurrent, 5), (LinearRegulatorFamily.LimitMin, 5.5), (LinearRegulatorFamily.LimitMax, 7), (LinearRegulatorFamily.Drop, 1),
        (LinearRegulatorFamily.DropResistance, 0.2), (LinearRegulatorFamily.LoadMin, 0), (LinearRegulatorFamily.Quiescent, 0), (LinearRegulatorFamily.Rejection, 1000),
        (LinearRegulatorFamily.JunctionMax, 150), (LinearRegulatorFamily.CaseCooling, 2.5), (LinearRegulatorFamily.Cooling, 10), (LinearRegulatorFamily.ReverseDiode, 0));

    // Practice case 6, computed by hand: 12 V from 24 V - 8 ohm I, 0 to 1.2 A: 4.50 W at 0.75 A, inside the range; 2.88 W at full load.
    [Fact]
    public void A_series_regulator_is_hottest_inside_its_range()
    {
        var requirement = Requirement.Empty.With("source", "dc").With("dc.low", "24").With("dc.nominal", "24").With("dc.high", "24").With("dc.resistance", "8")
            .With("regulation", "linear").With("output.voltage", "12").With("load.full", "1.2").With("short.held", "none").With("ambient.low", "40").With("ambient.high", "40");

        var row = Row(requirement, DemoParts.Fitted(requirement).Fit("U1", new(Linear)), "U1.junction-temperature");

        Assert.Equal(40 + 4.5 * 10, row.Stress!.Value, 0.01);
        Assert.Equal(0.75, row.At["load"], 0.01);
    }

    // Practice case 14, computed by hand: a transformer for 115 V 60 Hz on 126 V 50 Hz: 1.31 times the volt-seconds.
    [Fact]
    public void Volt_seconds_refuse_a_transformer_for_another_mains()
    {
        var requirement = Requirement.Empty.With("source", "mains").With("mains.voltage", "126").With("mains.low", "0").With("mains.high", "0")
            .With("mains.frequency", "50").With("mains.frequency-tolerance", "0");
        var part = DemoParts.Transformer.With(TransformerFamily.Primary, 115).With(TransformerFamily.FrequencyMin, 60).With(TransformerFamily.FluxMax, 1.15);

        var row = Row(requirement, DemoParts.Fitted(requirement).Fit("T1", new(part)), "T1.volt-seconds");

        Assert.Equal(1.31, row.Stress!.Value, 0.006);
        Assert.Equal(Verdict.Lacks, row.Verdict);
    }

    // Practice case 17: a 250 V fuse on 230 V +10 % passes, since the rating is of the nominal system.
    [Fact]
    public void A_fuse_is_rated_for_the_nominal_system()
    {
        var requirement = Requirement.Empty.With("source", "mains").With("mains.high", "10 %");

        Assert.Equal(Verdict.Holds, Row(requirement, DemoParts.Fitted(requirement), "F1.voltage").Verdict);
        Assert.Equal(Verdict.Lacks, Row(requirement, DemoParts.Fitted(requirement).Fit("F1", new(DemoParts.Fuse.With(FuseFamily.VoltageAc, 125))), "F1.voltage").Verdict);
    }

    // Practice case 13, computed by hand: sink 5 K/W in 55 °C, U1 4 W through 2.5 K/W and D5 2 W on it: U1 at 95 °C.
    [Fact]
    public void Parts_on_one_sink_warm_each_other()
    {
        var requirement = RequirementReader.Read(Standard.Registry, Requirement.Empty.With("sink", "U1 D5"));
        var stage = Standard.Registry.Stages.Single(s => s.Id == "thermal").Build(requirement, [new TwoHeaters()]);
        var values = new Dictionary<InputId, double>
        {
            [InputId.Axis(CommonFields.AmbientAxis)] = 55, [InputId.Link("loss.U1")] = 4, [InputId.Link("loss.D5")] = 2,
            [InputId.Column("HS1", HeatSinkFamily.Cooling)] = 5, [InputId.Column("HS1", HeatSinkFamily.Rise)] = 30,
            [InputId.Column("IN1", InterfaceFamily.Cooling)] = 0, [InputId.Column("U1", RegulatorFamily.CaseCooling)] = 2.5,
            [InputId.Column("D5", RectifierRatings.CaseCooling)] = 2,
        };
        var (links, stresses) = (new double[stage.Writes.Length], new double[stage.Stresses.Length]);

        Assert.Equal(SolveStatus.Solved, stage.Solve([.. stage.Inputs.Select(i => values[i.Id])], links, stresses, Budget.Standard));

        var place = stage.Stresses.ToList().FindIndex(s => s.Id == "U1.junction-temperature");
        Assert.Equal(95, stresses[place], 1e-9);
    }

    // Facts of the trade, no source: folded back to less than the load it never comes up; the diode that the maker asks for must be there.
    [Fact]
    public void A_folded_back_limit_below_the_load_hangs_on_the_way_up()
    {
        var requirement = Requirement.Empty.With("source", "dc").With("regulation", "linear").With("output.voltage", "12").With("load.full", "2").With("short.held", "none");
        var folded = Linear.With(LinearRegulatorFamily.FoldBack, 5).With(LinearRegulatorFamily.FoldBackCurrent, 0.2).With(LinearRegulatorFamily.DifferentialMax, 30)
            .With(LinearRegulatorFamily.LimitMin, 2.2).With(LinearRegulatorFamily.LimitMax, 3).With(LinearRegulatorFamily.ReverseDiode, 1);
        var design = DemoParts.Fitted(requirement).Fit("U1", new(folded));

        Assert.Equal(Verdict.Lacks, Row(requirement, design, "U1.start-up").Verdict);
        Assert.NotEqual(Verdict.Holds, Row(requirement, design, "U1.reverse-diode").Verdict);
        Assert.Equal(Verdict.Holds, Row(requirement, DemoParts.Fitted(requirement).Fit("U1", new(Linear)), "U1.start-up").Verdict);
    }

    // By the law of parallel branches: two equal capacitors, one at half the other's ESR, share 2 : 1; the bank bears 1.5 times one's rating.
    [Fact]
    public void Capacitors_in_parallel_share_by_their_resistance()
    {
        var requirement = Requirement.Empty.With("source", "mains");
        var one = Row(requirement, DemoParts.Fitted(requirement), "C1.ripple-current");
        var two = Row(requirement, DemoParts.Fitted(requirement).Fit("C1", Fitting.Parallel(DemoParts.Reservoir, 2)), "C1.ripple-current");

        Assert.Equal(1.5 * one.Rating!.Value, two.Rating!.Value, 1e-9);
        Assert.True(Row(requirement, DemoParts.Fitted(requirement).Fit("C1", Fitting.Parallel(DemoParts.Reservoir, 2)), "U1.input-least").Stress
            > Row(requirement, DemoParts.Fitted(requirement), "U1.input-least").Stress);
    }

    private static LedgerRow Row(Requirement requirement, Design design, string id) =>
        Assessor.Assess(Standard.Registry, design with { Requirement = requirement }, TestPolicy.Industrial, Budget.Standard).Rows.Single(r => r.Id == id);

    private sealed class TwoHeaters : StageModel
    {
        public TwoHeaters() => Heats =
        [
            new HeatSource("U1", "loss.U1", "temperature.U1", RegulatorFamily.Cooling, RegulatorFamily.JunctionMax) { CaseKey = RegulatorFamily.CaseCooling },
            new HeatSource("D5", "loss.D5", "temperature.D5", RectifierRatings.Cooling, RectifierRatings.JunctionMax) { CaseKey = RectifierRatings.CaseCooling },
        ];

        public override SolveStatus Solve(ReadOnlySpan<double> inputs, Span<double> links, Span<double> stresses, in Budget budget) => SolveStatus.Solved;
    }
}

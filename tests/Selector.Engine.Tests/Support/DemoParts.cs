using Selector.Engine.Parts;
using Selector.Engine.Parts.Families;
using Selector.Engine.Supplies;

namespace Selector.Engine.Tests.Support;

/// <summary>A full set of plausible parts for 24 V DC or 230 V mains down to some volts at an ampere or two.</summary>
internal static class DemoParts
{
    public static Part Regulator { get; } = TestPart.Of(RegulatorFamily.Spec, "U",
        (RegulatorFamily.InputMin, 7), (RegulatorFamily.InputMax, 60), (RegulatorFamily.OutputMin, 0.8), (RegulatorFamily.OutputMax, 30),
        (RegulatorFamily.OutputCurrent, 4), (RegulatorFamily.LimitMin, 4.6), (RegulatorFamily.LimitMax, 5.6), (RegulatorFamily.Frequency, 150e3),
        (RegulatorFamily.DutyMax, 0.95), (RegulatorFamily.OnTimeMin, 200e-9), (RegulatorFamily.Drop, 0), (RegulatorFamily.Resistance, 0.08),
        (RegulatorFamily.ResistanceDrift, 0.004), (RegulatorFamily.Transition, 30e-9), (RegulatorFamily.Quiescent, 5e-3),
        (RegulatorFamily.JunctionMax, 150), (RegulatorFamily.Cooling, 25), (RegulatorFamily.Start, 7.5), (RegulatorFamily.LoadMin, 0),
        (RegulatorFamily.InductanceMin, 5e-6), (RegulatorFamily.InductanceMax, 500e-6), (RegulatorFamily.CapacitanceMin, 50e-6),
        (RegulatorFamily.CapacitanceMax, 10e-3), (RegulatorFamily.EsrMin, 1e-3), (RegulatorFamily.EsrMax, 0.5));

    public static Part Catch { get; } = TestPart.Of(DiodeFamily.Spec, "D",
        (RectifierRatings.Reverse, 100), (RectifierRatings.Average, 10), (RectifierRatings.Knee, 90), (RectifierRatings.JunctionMax, 175),
        (RectifierRatings.Peak, 20), (RectifierRatings.Threshold, 0.42), (RectifierRatings.Slope, 0.02), (RectifierRatings.ThresholdDrift, -1e-3),
        (RectifierRatings.Cooling, 15), (RectifierRatings.Surge, 250), (RectifierRatings.MeltingIntegral, 300), (RectifierRatings.Leakage, 5e-3),
        (RectifierRatings.LeakageAt, 100), (RectifierRatings.RecoveryCharge, 30e-9)) with
    {
        Technology = DiodeFamily.Schottky,
    };

    public static Part Coil { get; } = TestPart.Of(InductorFamily.Spec, "L",
        (InductorFamily.Inductance, 47e-6), (InductorFamily.Tolerance, 0.2), (InductorFamily.Resistance, 0.03),
        (InductorFamily.Saturation, 8), (InductorFamily.Rms, 8), (InductorFamily.Rise, 40), (InductorFamily.TemperatureMax, 125),
        (InductorFamily.CoreLoss, 0.03), (InductorFamily.SaturationHot, 0.9));

    public static Part Output { get; } = TestPart.Of(CapacitorFamily.Spec, "C2",
        (CapacitorFamily.Capacitance, 680e-6), (CapacitorFamily.Tolerance, 0.2), (CapacitorFamily.Voltage, 25), (CapacitorFamily.Ripple, 1.2),
        (CapacitorFamily.EsrLow, 0.15), (CapacitorFamily.EsrHigh, 0.03), ("multiplier_100", 0.5), ("multiplier_1k", 0.8),
        ("multiplier_10k", 0.95), ("multiplier_100k", 1), (CapacitorFamily.TemperatureMax, 105),
        (CapacitorFamily.Life, 5000), (CapacitorFamily.Esl, 12e-9));

    public static Part Reservoir { get; } = TestPart.Of(CapacitorFamily.Spec, "C1",
        (CapacitorFamily.Capacitance, 4700e-6), (CapacitorFamily.Tolerance, 0.2), (CapacitorFamily.Voltage, 50), (CapacitorFamily.Ripple, 4),
        (CapacitorFamily.EsrLow, 0.05), (CapacitorFamily.EsrHigh, 0.03), ("multiplier_50", 0.8), ("multiplier_100", 1),
        ("multiplier_1k", 1.3), ("multiplier_10k", 1.4), ("multiplier_100k", 1.4), (CapacitorFamily.TemperatureMax, 105),
        (CapacitorFamily.Life, 5000), (CapacitorFamily.Esl, 20e-9));

    public static Part Bridge { get; } = TestPart.Of(BridgeFamily.Spec, "BR",
        (RectifierRatings.Reverse, 200), (RectifierRatings.Average, 6), (RectifierRatings.Knee, 70), (RectifierRatings.JunctionMax, 150),
        (RectifierRatings.Peak, 50), (RectifierRatings.Threshold, 0.8), (RectifierRatings.Slope, 0.04), (RectifierRatings.ThresholdDrift, -1.5e-3),
        (RectifierRatings.Cooling, 15), (RectifierRatings.Surge, 250), (RectifierRatings.MeltingIntegral, 300), (BridgeFamily.Basis, BridgeFamily.BasisOutput));

    public static Part Transformer { get; } = TestPart.Of(TransformerFamily.Spec, "T",
        (TransformerFamily.Primary, 230), (TransformerFamily.Halves, 1), (TransformerFamily.NoLoad, 17), (TransformerFamily.Resistance, 0.45),
        (TransformerFamily.ResistanceAt, 20), (TransformerFamily.Leakage, 0.3e-3), (TransformerFamily.Current, 4), (TransformerFamily.Power, 60),
        (TransformerFamily.WindingMax, 115), (TransformerFamily.FrequencyMin, 50), (TransformerFamily.Tolerance, 0.02),
        (TransformerFamily.Magnetising, 0.03), (TransformerFamily.FluxMax, 1.3), (TransformerFamily.FuseMax, 2), (TransformerFamily.DirectMax, 1));

    public static Part Sense { get; } = TestPart.Of(ResistorFamily.Spec, "R",
        (ResistorFamily.Resistance, 1), (ResistorFamily.Tolerance, 0.01), (ResistorFamily.Power, 5), (ResistorFamily.Knee, 70),
        (ResistorFamily.Zero, 155), (ResistorFamily.Voltage, 100), (ResistorFamily.Drift, 50e-6),
        (ResistorFamily.PulseEnergy, 5));

    public static Part Bypass { get; } = TestPart.Of(FilmCapacitorFamily.Spec, "C3",
        (FilmCapacitorFamily.Capacitance, 1e-6), (FilmCapacitorFamily.Tolerance, 0.1), (FilmCapacitorFamily.Voltage, 100), (FilmCapacitorFamily.Ripple, 12),
        (FilmCapacitorFamily.Esr, 0.02), (FilmCapacitorFamily.TemperatureMax, 105));

    public static Part Inlet { get; } = TestPart.Of(ConnectorFamily.Spec, "J",
        (ConnectorFamily.Current, 16), (ConnectorFamily.Voltage, 250), (ConnectorFamily.Contacts, 2), (ConnectorFamily.Knee, 70), (ConnectorFamily.TemperatureMax, 130));

    public static Part Switch { get; } = TestPart.Of(SwitchFamily.Spec, "S",
        (SwitchFamily.Current, 6), (SwitchFamily.Voltage, 250), (SwitchFamily.Inrush, 120), (SwitchFamily.Knee, 70), (SwitchFamily.TemperatureMax, 120));

    public static Part Fuse { get; } = TestPart.Of(FuseFamily.Spec, "F",
        (FuseFamily.Current, 0.63), (FuseFamily.Class, 2), (FuseFamily.OpensAt, 2.75), (FuseFamily.VoltageAc, 250), (FuseFamily.VoltageDc, 150),
        (FuseFamily.BreakingAc, 1500), (FuseFamily.BreakingDc, 1500), (FuseFamily.Melting, 4), (FuseFamily.Loss, 1), (FuseFamily.Knee, 60), (FuseFamily.Zero, 200));

    public static Part Holder { get; } = TestPart.Of(FuseHolderFamily.Spec, "X",
        (FuseHolderFamily.Current, 10), (FuseHolderFamily.Voltage, 250), (FuseHolderFamily.Power, 4), (FuseHolderFamily.Knee, 23), (FuseHolderFamily.Zero, 120));

    /// <summary>Every position of a supply filled, whichever front end it has.</summary>
    public static Design Fitted(Requirement requirement) => new Design(requirement, Design.Empty.Fittings)
        .Fit("T1", new(Transformer)).Fit("BR1", new(Bridge)).Fit("D1-D4", new(Catch)).Fit("D1-D2", new(Catch)).Fit("D1", new(Catch))
        .Fit("C1", new(Reservoir)).Fit("U1", new(Regulator)).Fit("D5", new(Catch)).Fit("L1", new(Coil)).Fit("C2", new(Output))
        .Fit("R4", Fitting.Parallel(Sense, 10)).Fit("C3", new(Bypass)).Fit("J1", new(Inlet)).Fit("J2", new(Inlet)).Fit("S1", new(Switch))
        .Fit("F1", new(requirement.Texts.GetValueOrDefault("source") == "mains" ? Fuse : Fuse.With(FuseFamily.Current, 6.3).With(FuseFamily.Melting, 400))).Fit("XF1", new(Holder));
}

using Selector.Engine.Circuits.Bleeder;
using Selector.Engine.Circuits.CurrentLimit;
using Selector.Engine.Circuits.Direct;
using Selector.Engine.Circuits.Events;
using Selector.Engine.Circuits.Inlet;
using Selector.Engine.Circuits.Life;
using Selector.Engine.Circuits.Mains;
using Selector.Engine.Circuits.Output;
using Selector.Engine.Circuits.Preload;
using Selector.Engine.Circuits.Protection;
using Selector.Engine.Circuits.SecondaryFuse;
using Selector.Engine.Circuits.Series;
using Selector.Engine.Circuits.StepDown;
using Selector.Engine.Circuits.Terminals;
using Selector.Engine.Circuits.Thermal;
using Selector.Engine.Parts.Families;
using Selector.Engine.Supplies;

namespace Selector.Engine;

/// <summary>The stages and families that ship with the product. Registering one here is all it takes to add it.</summary>
public static class Standard
{
    public static Registry Registry { get; } = new(
        [
            new OutputStage(),
            new LifeStage(),
            new InletStage(),
            new MainsStage(),
            new SecondaryFuseStage(),
            new DirectInletStage(),
            new DirectStage(),
            new BleederStage(),
            new StepDownStage(),
            new SeriesStage(),
            new SenseStage(),
            new PreloadStage(),
            new TerminalStage(),
            new ProtectionStage(),
            new SwitchOnStage(),
            new HoldUpStage(),
            new ThermalStage(),
        ],
        [
            TransformerFamily.Spec,
            BridgeFamily.Spec,
            DiodeFamily.Spec,
            CapacitorFamily.Spec,
            RegulatorFamily.Spec,
            InductorFamily.Spec,
            ResistorFamily.Spec,
            HeatSinkFamily.Spec,
            InterfaceFamily.Spec,
            LinearRegulatorFamily.Spec,
            FilmCapacitorFamily.Spec,
            FuseFamily.Spec,
            FuseHolderFamily.Spec,
            LimiterFamily.Spec,
            VaristorFamily.Spec,
            SwitchFamily.Spec,
            ConnectorFamily.Spec,
        ]);
}

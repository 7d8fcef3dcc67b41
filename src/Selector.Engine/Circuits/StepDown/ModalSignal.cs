namespace Selector.Engine.Circuits.StepDown;

/// <summary>One voltage or current of a linear circuit as a constant plus multiples of the mode functions.</summary>
internal readonly record struct ModalSignal(double Constant, double Fast, double Even, double Odd)
{
    public double At(in ModeValues m) => Constant + Fast * m.Fast + Even * m.Even + Odd * m.Odd;

    /// <summary>The time derivative, a signal of the same modes.</summary>
    public ModalSignal Derivative(in NaturalModes modes) =>
        new(0, Fast * modes.Fast, Even * modes.Decay + Odd, Odd * modes.Decay - Even * modes.Square);

    /// <summary>The same signal with its time counted from where the mode functions are <paramref name="m"/>.</summary>
    public ModalSignal From(in ModeValues m, double square) =>
        new(Constant, Fast * m.Fast, Even * m.Even + Odd * m.Odd, Odd * m.Even - Even * square * m.Odd);
}

namespace Selector.Engine.Circuits.Thermal;

/// <summary>
/// A closed box of sheet metal on a bench, its bottom covered: heat goes by natural convection from the air inside to the walls,
/// and from the walls by convection and radiation into the room.
/// </summary>
/// <param name="Width">m, 0.01 to 10.</param>
/// <param name="Height">m.</param>
/// <param name="Depth">m.</param>
/// <param name="Emissivity">Of the outside, 0 to 1: 0.9 painted, 0.1 bare bright metal (common practice).</param>
/// <param name="Pressure">Air pressure over that at sea level; convection goes with its square root.</param>
public readonly record struct Enclosure(double Width, double Height, double Depth, double Emissivity, double Pressure)
{
    private const double StefanBoltzmann = 5.670374e-8;
    private const double Kelvin = 273.15;

    // Simplified natural convection in air, laminar, lengths in metres: W/(m² K) = c (ΔT/L)^0.25.
    private const double Vertical = 1.42;
    private const double FacingUp = 1.32;

    /// <summary>Hottest wall that is looked for above the room, K.</summary>
    private const double Hottest = 5000;

    private double Sides => 2 * Height * (Width + Depth);

    private double Top => Width * Depth;

    private double TopLength => 2 * Width * Depth / (Width + Depth);

    /// <summary>Rise of the air inside over the room, K.</summary>
    /// <param name="power">W, at least 0.</param>
    /// <param name="ambient">Room, °C.</param>
    public double Rise(double power, double ambient)
    {
        if (!(power > 0))
        {
            return 0;
        }

        var box = this;
        var wall = Root(rise => box.Outside(rise, ambient) - power);
        return wall + Root(rise => box.Convection(rise) - power);
    }

    /// <summary>Heat that the walls give off at a rise over the room, W.</summary>
    public double Outside(double rise, double ambient)
    {
        var (room, wall) = (ambient + Kelvin, ambient + rise + Kelvin);
        var radiation = Emissivity * StefanBoltzmann * (wall * wall + room * room) * (wall + room);
        return Convection(rise) + (Sides + Top) * radiation * rise;
    }

    /// <summary>Heat by convection at a difference between air and walls, W.</summary>
    public double Convection(double difference) => Math.Sqrt(Pressure) * difference
        * (Sides * Vertical * Math.Pow(difference / Height, 0.25) + Top * FacingUp * Math.Pow(difference / TopLength, 0.25));

    /// <summary>Both laws rise steadily: halving the interval finds the one root.</summary>
    private static double Root(Func<double, double> excess)
    {
        var (low, high) = (0.0, Hottest);
        for (var i = 0; i < 60 && high - low > 1e-9 * high; i++)
        {
            var middle = (low + high) / 2;
            (low, high) = excess(middle) < 0 ? (middle, high) : (low, middle);
        }

        return (low + high) / 2;
    }
}

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

    private const int MostNewton = 30;

    private double Sides => 2 * Height * (Width + Depth);

    private double Top => Width * Depth;

    private double TopLength => 2 * Width * Depth / (Width + Depth);

    /// <summary>Heat by convection at a difference of one kelvin, W; it goes with the power of 1.25.</summary>
    private double Convecting => Math.Sqrt(Pressure)
        * (Sides * Vertical / Math.Pow(Height, 0.25) + Top * FacingUp / Math.Pow(TopLength, 0.25));

    /// <summary>Rise of the air inside over the room, K.</summary>
    /// <param name="power">W, at least 0.</param>
    /// <param name="ambient">Room, °C.</param>
    public double Rise(double power, double ambient)
    {
        if (!(power > 0))
        {
            return 0;
        }

        // Without radiation the walls would be hotter than they are; from there Newton's method is at the root in some five steps.
        var convecting = Convecting;
        var film = Math.Pow(power / convecting, 0.8);
        var wall = film;
        for (var i = 0; i < MostNewton; i++)
        {
            var convected = convecting * Math.Pow(wall, 1.25);
            var radiated = (Sides + Top) * Radiation(wall, ambient) * wall;
            var step = (convected + radiated - power) / ((1.25 * convected + radiated) / wall);
            wall -= step;
            if (Math.Abs(step) <= 1e-12 * wall)
            {
                break;
            }
        }

        return wall + film;
    }

    /// <summary>Heat that the walls give off at a rise over the room, W.</summary>
    public double Outside(double rise, double ambient) => Convection(rise) + (Sides + Top) * Radiation(rise, ambient) * rise;

    /// <summary>Heat by convection at a difference between air and walls, W.</summary>
    public double Convection(double difference) => Convecting * Math.Pow(difference, 1.25);

    /// <summary>W/(m² K).</summary>
    private double Radiation(double rise, double ambient)
    {
        var (room, wall) = (ambient + Kelvin, ambient + rise + Kelvin);
        return Emissivity * StefanBoltzmann * (wall * wall + room * room) * (wall + room);
    }
}

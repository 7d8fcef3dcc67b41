namespace Selector.Engine.Quantities;

/// <summary>The series of preferred numbers of IEC 60063. The number is the count of values in a decade.</summary>
public enum PreferredSeries
{
    /// <summary>Three per decade.</summary>
    E3 = 3,

    /// <summary>Six per decade, once for parts of 20 %.</summary>
    E6 = 6,

    /// <summary>Twelve per decade, 10 %.</summary>
    E12 = 12,

    /// <summary>Twenty-four per decade, 5 %.</summary>
    E24 = 24,

    /// <summary>Forty-eight per decade, 2 %.</summary>
    E48 = 48,

    /// <summary>Ninety-six per decade, 1 %.</summary>
    E96 = 96,

    /// <summary>One hundred and ninety-two per decade, 0.5 % and closer.</summary>
    E192 = 192,
}

using System.Collections.Immutable;

namespace Selector.Engine.Quantities;

/// <summary>How a unit is written: with SI prefixes, as it stands, or as a fraction shown in per cent.</summary>
public enum UnitScale
{
    /// <summary>Takes SI prefixes: 4.7 µF, 10 kΩ.</summary>
    Prefixed,

    /// <summary>Never takes a prefix: °C, K/W, A²s.</summary>
    Plain,

    /// <summary>Kept as a fraction, written and read in per cent.</summary>
    Percent,
}

/// <summary>A unit of measure: the sign that is written after the number, and how numbers carry it.</summary>
/// <param name="Symbol">The sign as printed, for example "Ω"; empty for a pure number.</param>
/// <param name="Name">The name in words, for messages: "ohm".</param>
/// <param name="Scale">Whether prefixes or per cent apply.</param>
/// <param name="Key">The last part of a column name in files: "ohm". ASCII, lower case, letters, digits and underscore.</param>
/// <param name="Spellings">Other ways in which people type it; compared without regard to case unless the spelling has upper case letters.</param>
public sealed record Unit(string Symbol, string Name, UnitScale Scale, string Key, params string[] Spellings)
{
    /// <inheritdoc/>
    public override string ToString() => Symbol;
}

/// <summary>The units of this product.</summary>
public static class Units
{
    public static readonly Unit Volt = new("V", "volt", UnitScale.Prefixed, "v", "volt", "volts", "Vdc", "Vac", "Vrms");
    public static readonly Unit Ampere = new("A", "ampere", UnitScale.Prefixed, "a", "amp", "amps", "ampere", "amperes");
    public static readonly Unit Ohm = new("Ω", "ohm", UnitScale.Prefixed, "ohm", "ohm", "ohms", "\u2126", "R");
    public static readonly Unit Farad = new("F", "farad", UnitScale.Prefixed, "farad", "farad", "farads");
    public static readonly Unit Henry = new("H", "henry", UnitScale.Prefixed, "henry", "henry", "henries");
    public static readonly Unit Hertz = new("Hz", "hertz", UnitScale.Prefixed, "hz", "hertz", "c/s");
    public static readonly Unit Watt = new("W", "watt", UnitScale.Prefixed, "w", "watt", "watts");
    public static readonly Unit VoltAmpere = new("VA", "volt-ampere", UnitScale.Prefixed, "va", "va");
    public static readonly Unit Second = new("s", "second", UnitScale.Prefixed, "s", "sec", "second", "seconds");
    public static readonly Unit Hour = new("h", "hour", UnitScale.Prefixed, "h", "hr", "hrs", "hour", "hours");
    public static readonly Unit Celsius = new("°C", "degree Celsius", UnitScale.Plain, "degc", "C", "degC", "deg C", "\u2103", "° C");
    public static readonly Unit Kelvin = new("K", "kelvin", UnitScale.Plain, "k", "kelvin");
    public static readonly Unit KelvinPerWatt = new("K/W", "kelvin per watt", UnitScale.Plain, "k_per_w", "K/W", "°C/W", "C/W");
    public static readonly Unit PerKelvin = new("1/K", "per kelvin", UnitScale.Prefixed, "per_k", "/K", "K^-1", "/°C", "/C");
    public static readonly Unit VoltPerKelvin = new("V/K", "volt per kelvin", UnitScale.Prefixed, "v_per_k", "V/K");

    // By the SI rule kA²s is (kA)²s, a million A²s, yet data sheets mean a thousand: so no prefix, neither read nor written.
    public static readonly Unit AmpereSquaredSecond = new("A²s", "ampere squared second", UnitScale.Plain, "a2s", "A2s", "A^2s");
    public static readonly Unit Millimetre = new("mm", "millimetre", UnitScale.Plain, "mm", "mm");
    public static readonly Unit Metre = new("m", "metre", UnitScale.Plain, "m", "m", "metre", "meter");
    public static readonly Unit Joule = new("J", "joule", UnitScale.Prefixed, "j", "joule", "joules", "Ws");
    public static readonly Unit WattPerKelvin = new("W/K", "watt per kelvin", UnitScale.Prefixed, "w_per_k", "W/K", "W/°C");
    // Written in ampere seconds: a C already means the degree.
    public static readonly Unit Coulomb = new("As", "ampere second", UnitScale.Prefixed, "coulomb", "As", "coulomb");
    public static readonly Unit Percent = new("%", "per cent", UnitScale.Percent, "frac", "percent", "per cent", "pct");
    public static readonly Unit One = new("", "number", UnitScale.Plain, "n");

    /// <summary>Every unit of this product, in a fixed order; must stay below the fields that it lists.</summary>
    public static ImmutableArray<Unit> All { get; } =
    [
        Volt, Ampere, Ohm, Farad, Henry, Hertz, Watt, VoltAmpere, Second, Hour, Celsius, Kelvin, KelvinPerWatt,
        PerKelvin, VoltPerKelvin, AmpereSquaredSecond, Millimetre, Metre, Joule, WattPerKelvin, Coulomb, Percent, One,
    ];
}

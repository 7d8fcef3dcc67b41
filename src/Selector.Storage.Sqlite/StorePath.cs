namespace Selector.Storage.Sqlite;

/// <summary>Where the embedded store lies when nobody says.</summary>
public static class StorePath
{
    /// <summary>Name of the setting, as configuration files write it.</summary>
    public const string Setting = "Selector:Store";

    /// <summary>Name of the environment variable.</summary>
    public const string Variable = "SELECTOR_STORE";

    /// <summary>
    /// The setting; else the variable; else selector/selector.db in the data folder of the person. A relative XDG_DATA_HOME is to be
    /// ignored (XDG Base Directory Specification 0.8).
    /// </summary>
    /// <param name="setting">Value of <see cref="Setting"/>; null or empty when not set.</param>
    /// <param name="environment">Reads a variable of the environment.</param>
    public static string Find(string? setting, Func<string, string?> environment)
    {
        ArgumentNullException.ThrowIfNull(environment);
        if (!string.IsNullOrWhiteSpace(setting))
        {
            return Path.GetFullPath(setting);
        }

        if (environment(Variable) is { } variable && !string.IsNullOrWhiteSpace(variable))
        {
            return Path.GetFullPath(variable);
        }

        var data = environment("XDG_DATA_HOME") is { Length: > 0 } home && Path.IsPathRooted(home)
            ? home
            : Path.Combine(environment("HOME") is { Length: > 0 } own ? own : Path.GetTempPath(), ".local", "share");
        return Path.Combine(data, "selector", "selector.db");
    }

    /// <summary>The same, from the environment of this process.</summary>
    public static string Find(string? setting) => Find(setting, Environment.GetEnvironmentVariable);
}

namespace Selector.Reference.Support;

/// <summary>A theory that needs ngspice on the search path and is skipped, with that reason, where it is missing.</summary>
[AttributeUsage(AttributeTargets.Method)]
internal sealed class NgspiceTheoryAttribute : TheoryAttribute
{
    public NgspiceTheoryAttribute()
    {
        var path = Environment.GetEnvironmentVariable("PATH") ?? "";
        if (!path.Split(Path.PathSeparator).Any(folder => File.Exists(Path.Combine(folder, "ngspice"))))
        {
            Skip = "ngspice is not installed";
        }
    }
}

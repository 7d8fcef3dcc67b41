namespace Selector.Browser.Support;

/// <summary>A fact that needs Debian's Chromium and is skipped, with that reason, where it is missing.</summary>
[AttributeUsage(AttributeTargets.Method)]
internal sealed class ChromiumFactAttribute : FactAttribute
{
    public const string Path = "/usr/bin/chromium";

    public ChromiumFactAttribute()
    {
        if (!File.Exists(Path))
        {
            Skip = "Chromium is not installed at " + Path;
        }
    }
}

namespace Selector.Application.Catalogue;

/// <summary>
/// Text cells that a spreadsheet would take for a formula get an apostrophe in front when they leave and lose it when they come
/// back (OWASP, CSV injection). A cell that begins with an apostrophe of its own gets one more, so that every text comes back as
/// it was. Numbers are written by the program and need none of this: -0.002 stays a number.
/// </summary>
internal static class SafeCell
{
    private const string Dangerous = "=+-@\t\r\n'";

    public static string Out(string text) => text.Length > 0 && Dangerous.Contains(text[0], StringComparison.Ordinal) ? "'" + text : text;

    public static string In(string cell) =>
        cell.Length > 1 && cell[0] == '\'' && Dangerous.Contains(cell[1], StringComparison.Ordinal) ? cell[1..] : cell;
}

using Selector.Documents.Model;

namespace Selector.Documents.Pdf;

/// <summary>The title block at the head of a paper: which supply, which paper, what it rests on, and who signs.</summary>
internal static class Head
{
    private const double Pad = 6;
    private const double NameShare = 0.32;
    private const double SignHeight = 34;

    public static void Draw(Flow flow, Report report)
    {
        var form = flow.Form;
        var cover = report.Cover;
        var faces = flow.Faces;
        var top = flow.Y;
        var split = form.Left + form.Inner * NameShare;
        var name = Wrap.Lines(cover.Name, faces.Name, split - form.Left - 2 * Pad, 3);
        var factWidth = (form.Right - split) / cover.Facts.Length;
        var facts = cover.Facts.Select(f => (
            Fact: f,
            Value: Wrap.Lines(f.Value, faces.Strong, factWidth - 2 * Pad),
            Note: Wrap.Lines(f.Note, faces.Small, factWidth - 2 * Pad))).ToList();
        var factHeight = Pad + faces.Small.Line + facts.Max(f => f.Value.Length * faces.Strong.Line + f.Note.Length * faces.Small.Line) + Pad;
        var nameHeight = Pad + faces.Small.Line + name.Length * faces.Name.Line + faces.Heading.Line + Pad;
        var height = Math.Max(nameHeight, factHeight + SignHeight);

        flow.Draw(cover.Number, faces.Small, flow.Ink.Quiet, form.Left + Pad, top + Pad);
        var y = flow.Draw(name, faces.Name, flow.Ink.Plain, form.Left + Pad, top + Pad + faces.Small.Line);
        flow.Draw(report.Title, faces.Heading, flow.Ink.Plain, form.Left + Pad, y + 1);

        var x = split;
        var signTop = top + height - SignHeight;
        foreach (var (fact, value, note) in facts)
        {
            flow.Graphics.DrawLine(flow.Ink.Hairline, x, top, x, signTop);
            flow.Draw(fact.Label, faces.Small, flow.Ink.Quiet, x + Pad, top + Pad);
            var under = flow.Draw(value, faces.Strong, flow.Ink.Plain, x + Pad, top + Pad + faces.Small.Line);
            flow.Draw(note, faces.Small, flow.Ink.Quiet, x + Pad, under);
            x += factWidth;
        }

        flow.Graphics.DrawLine(flow.Ink.Hairline, split, signTop, form.Right, signTop);
        Sign(flow, cover, split, signTop);
        flow.Graphics.DrawLine(flow.Ink.Rule, split, top, split, top + height);
        flow.Y = top + height;
        flow.Rule(flow.Ink.Rule);
    }

    /// <summary>A name that is known is printed; the line stays, since a printed name is no signature.</summary>
    private static void Sign(Flow flow, Cover cover, double left, double top)
    {
        var width = (flow.Form.Right - left) / cover.Signatures.Length;
        var x = left;
        foreach (var who in cover.Signatures)
        {
            flow.Graphics.DrawLine(flow.Ink.Hairline, x, top, x, top + SignHeight);
            flow.Draw(who.Label, flow.Faces.Small, flow.Ink.Quiet, x + Pad, top + 3);
            flow.DrawRight("signed, date", flow.Faces.Small, flow.Ink.Quiet, x + width - Pad, top + 3);
            flow.Draw(Wrap.OneLine(who.Value, flow.Faces.Text, width - 2 * Pad), flow.Faces.Text, flow.Ink.Plain, x + Pad, top + SignHeight - 17);
            flow.Graphics.DrawLine(flow.Ink.Rule, x + Pad, top + SignHeight - 6, x + width - Pad, top + SignHeight - 6);
            x += width;
        }
    }
}

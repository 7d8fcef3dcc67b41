using Selector.Documents.Model;

namespace Selector.Documents.Pdf;

/// <summary>The strip of counts: numbers large, words beside them, and the sentence beneath.</summary>
internal static class Strip
{
    private const double Pad = 5;
    private const double After = 11;
    private const double Height = 21;

    public static void Draw(Flow flow, CountStrip strip)
    {
        var faces = flow.Faces;
        var x = flow.Form.Left;
        flow.Need(2 * Height);
        foreach (var item in strip.Items)
        {
            var mark = item.Mark == Mark.None ? 0 : Marks.Width;
            var width = Pad + mark + faces.Count.Width(item.Value) + 4 + faces.Text.Width(item.Words) + After;
            if (x + width > flow.Form.Right)
            {
                flow.Y += Height;
                flow.Rule(flow.Ink.Hairline);
                x = flow.Form.Left;
            }

            var brush = flow.Ink.Of(item.Tone);
            Marks.Draw(flow.Graphics, item.Mark, brush, x + Pad, flow.Y + Height / 2);
            var at = x + Pad + mark;
            flow.Draw(item.Value, faces.Count, brush, at, flow.Y + 4);
            flow.Draw(item.Words, item.Tone == Tone.Lacks ? faces.Strong : faces.Text, brush, at + faces.Count.Width(item.Value) + 4, flow.Y + 6.6);
            x += width;
            flow.Graphics.DrawLine(flow.Ink.Hairline, x, flow.Y, x, flow.Y + Height);
        }

        flow.Y += Height;
        flow.Rule(flow.Ink.Hairline);
        var summary = Wrap.Lines(strip.Summary, faces.Strong, flow.Form.Inner - 2 * Pad);
        flow.Y = flow.Draw(summary, faces.Strong, flow.Ink.Plain, flow.Form.Left + Pad, flow.Y + 3) + 3;
        flow.Rule(flow.Ink.Rule);
    }
}

using System.Collections.Immutable;
using Selector.Documents.Model;

namespace Selector.Documents.Pdf;

/// <summary>Labelled values and warnings, side by side in ruled cells of equal width.</summary>
internal static class Grid
{
    private const double Pad = 5;
    private const int FactColumns = 7;
    private const int CautionColumns = 3;

    public static void Draw(Flow flow, FactGrid grid)
    {
        if (grid.Facts.IsEmpty)
        {
            flow.Draw("None.", flow.Faces.Small, flow.Ink.Quiet, flow.Form.Left + Pad, flow.Y);
            flow.Y += flow.Faces.Small.Line + 4;
        }

        var width = flow.Form.Inner / FactColumns;
        foreach (var row in grid.Facts.Chunk(FactColumns))
        {
            var cells = row.Select(f => new FactLines(f, flow.Faces, width - 2 * Pad)).ToList();
            var height = cells.Max(c => c.Height) + 2 * 3;
            flow.Need(height);
            for (var i = 0; i < cells.Count; i++)
            {
                var x = flow.Form.Left + i * width;
                cells[i].Draw(flow, x + Pad, flow.Y + 3, width - 2 * Pad);
                flow.Graphics.DrawLine(flow.Ink.Hairline, x + width, flow.Y, x + width, flow.Y + height);
            }

            flow.Y += height;
            flow.Rule(flow.Ink.Hairline);
        }

        flow.Rule(flow.Ink.Rule);
    }

    /// <summary>A bar at its left that no other block has: warnings are found without reading.</summary>
    public static void Draw(Flow flow, Caution caution)
    {
        const double Bar = 3;
        var width = (flow.Form.Inner - Bar) / CautionColumns;
        var rows = caution.Points.Chunk(CautionColumns)
            .Select(row => row.Select(p => Wrap.Lines(p.Text, flow.Faces.Small, width - 2 * Pad)).ToImmutableArray())
            .ToList();
        var heights = rows.Select(r => r.Max(l => l.Length) * flow.Faces.Small.Line + flow.Faces.SmallStrong.Line + 5).ToList();
        flow.Need(heights.Sum() + flow.Faces.Heading.Line + 8);
        var top = flow.Y;
        flow.Draw(caution.Heading, flow.Faces.Heading, flow.Ink.Plain, flow.Form.Left + Bar + Pad, flow.Y + 3);
        flow.Y += flow.Faces.Heading.Line + 5;
        for (var r = 0; r < rows.Count; r++)
        {
            for (var i = 0; i < rows[r].Length; i++)
            {
                var x = flow.Form.Left + Bar + Pad + i * width;
                flow.Draw(caution.Points[r * CautionColumns + i].Word, flow.Faces.SmallStrong, flow.Ink.Plain, x, flow.Y);
                flow.Draw(rows[r][i], flow.Faces.Small, flow.Ink.Plain, x, flow.Y + flow.Faces.SmallStrong.Line);
            }

            flow.Y += heights[r];
        }

        flow.Y += 2;
        flow.Graphics.DrawRectangle(flow.Ink.Plain, flow.Form.Left, top, Bar, flow.Y - top);
        flow.Rule(flow.Ink.Rule);
    }

    /// <summary>A value on tint over a ruled line, as it was typed; beneath it how it was understood.</summary>
    private sealed class FactLines(Fact fact, Faces faces, double width)
    {
        private readonly ImmutableArray<string> _label = Wrap.Lines(fact.Label, faces.Small, width);
        private readonly ImmutableArray<string> _value = Wrap.Lines(fact.Value.Length == 0 ? "\u2013" : fact.Value, faces.Text, width - 4);
        private readonly ImmutableArray<string> _note = Wrap.Lines(fact.Fault.Length > 0 ? fact.Fault : fact.Note, fact.Fault.Length > 0 ? faces.SmallStrong : faces.Small, width);

        public double Height => _label.Length * faces.Small.Line + ValueHeight + 1 + _note.Length * faces.Small.Line;

        private double ValueHeight => _value.Length * faces.Text.Line + 2;

        public void Draw(Flow flow, double x, double top, double fieldWidth)
        {
            var y = flow.Draw(_label, faces.Small, flow.Ink.Quiet, x, top);
            flow.Graphics.DrawRectangle(flow.Ink.Field, x, y, fieldWidth, ValueHeight);
            flow.Graphics.DrawLine(flow.Ink.Rule, x, y + ValueHeight, x + fieldWidth, y + ValueHeight);
            flow.Draw(_value, faces.Text, flow.Ink.Plain, x + 2, y + 1);
            flow.Draw(_note, fact.Fault.Length > 0 ? faces.SmallStrong : faces.Small, fact.Fault.Length > 0 ? flow.Ink.Plain : flow.Ink.Quiet, x, y + ValueHeight + 1);
        }
    }
}

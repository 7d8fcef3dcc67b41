using System.Collections.Immutable;
using PdfSharp.Drawing;
using Selector.Documents.Model;

namespace Selector.Documents.Pdf;

/// <summary>A cell broken into lines for a width: measured first, so that a row is known whole before it is drawn.</summary>
internal sealed class CellLayout
{
    private const int MostLines = 30;
    private readonly Cell _cell;
    private readonly Face _face;
    private readonly Faces _faces;
    private readonly Align _align;
    private readonly double _width;
    private readonly ImmutableArray<string> _lines;
    private readonly ImmutableArray<string> _note;

    public CellLayout(Cell cell, Align align, double width, Faces faces, bool strong)
    {
        _cell = cell;
        _faces = faces;
        _align = align;
        _width = width;
        _face = (strong && cell is NumberCell) || cell is TextCell { Strong: true } or VerdictCell { Tone: Tone.Lacks } ? faces.Strong : faces.Text;
        _lines = Wrap.Lines(cell.Text, _face, width - Indent, MostLines);
        _note = Wrap.Lines(cell.Note, faces.Small, width, MostLines);
    }

    public double Height => Math.Max(1, _lines.Length) * _face.Line + _note.Length * _faces.Small.Line;

    private double Indent => _cell is VerdictCell ? Marks.Width : 0;

    public void Draw(Flow flow, double x, double top)
    {
        if (_cell is ScaleCell { Scale: { } scale })
        {
            Scale.Draw(flow, scale, x, _width, top);
            return;
        }

        var brush = flow.Ink.Of(_cell switch
        {
            TextCell text => text.Tone,
            VerdictCell verdict => verdict.Tone,
            _ => Tone.Plain,
        });
        if (_cell is VerdictCell { Mark: var mark })
        {
            Marks.Draw(flow.Graphics, mark, brush, x, top + _face.Line / 2);
        }

        var y = Lines(flow, _lines, _face, brush, x + Indent, top);
        Lines(flow, _note, _faces.Small, flow.Ink.Quiet, x, y);
    }

    private double Lines(Flow flow, ImmutableArray<string> lines, Face face, XBrush brush, double x, double top)
    {
        if (_align == Align.Left)
        {
            return flow.Draw(lines, face, brush, x, top);
        }

        foreach (var line in lines)
        {
            flow.DrawRight(line, face, brush, x + _width - Indent, top);
            top += face.Line;
        }

        return top;
    }
}

using System.Collections.Immutable;
using Selector.Documents.Model;

namespace Selector.Documents.Pdf;

/// <summary>Draws a table over as many sheets as it takes: head on each, no row in two.</summary>
internal sealed class TableDrawer
{
    private const double Pad = 3.2;
    private const double Indent = 1.8;
    private const double RowPad = 2.2;

    /// <summary>A table does not begin with less than this many rows at the foot of a sheet.</summary>
    private const int Together = 2;
    private readonly Flow _flow;
    private readonly Table _table;
    private readonly ImmutableArray<(double Left, double Width)> _places;
    private readonly ImmutableArray<CellLayout> _heads;

    private TableDrawer(Flow flow, Table table)
    {
        _flow = flow;
        _table = table;
        var unit = (flow.Form.Inner - 2 * Indent) / table.Columns.Sum(c => c.Width);
        var x = flow.Form.Left + Indent;
        var places = ImmutableArray.CreateBuilder<(double, double)>();
        foreach (var column in table.Columns)
        {
            places.Add((x + Pad, column.Width * unit - 2 * Pad));
            x += column.Width * unit;
        }

        _places = places.ToImmutable();
        _heads = [.. table.Columns.Select((c, i) => new CellLayout(Cell.Empty with { Note = c.Head }, c.Align, _places[i].Width, flow.Faces, false))];
    }

    private double CaptionHeight => _table.Caption.Length == 0 ? 0 : _flow.Faces.Heading.Line + 7;

    private double HeadHeight => _heads.Max(h => h.Height) - _flow.Faces.Text.Line + 2 * RowPad;

    public static void Draw(Flow flow, Table table) => new TableDrawer(flow, table).Draw();

    private void Draw()
    {
        var first = _table.Rows.IsEmpty ? 14 : _table.Rows.Take(Together).Sum(r => Layout(r.Cells, r).Height);
        _flow.Need(CaptionHeight + HeadHeight + first + 4);
        Head("");
        for (var i = 0; i < _table.Rows.Length; i++)
        {
            DrawRow(_table.Rows[i], i);
        }

        var closing = _table.Rows.IsEmpty ? _table.WhenEmpty : _table.Closing;
        if (_flow.Need(_flow.Faces.Small.Line + 6))
        {
            Head(" (continued)");
        }

        _flow.Rule(_table.Rows.IsEmpty ? _flow.Ink.Hairline : _flow.Ink.Rule);
        _flow.Draw(closing, _flow.Faces.Small, _flow.Ink.Quiet, _places[0].Left, _flow.Y + 2);
        _flow.Y += _flow.Faces.Small.Line + 6;
    }

    private void DrawRow(Row row, int index)
    {
        var (cells, height) = Layout(row.Cells, row);
        if (_flow.Room < height)
        {
            _flow.NewSheet();
            Head(" (continued)");
            (cells, height) = Layout(row.AtTop.IsEmpty ? row.Cells : row.AtTop, row);
        }
        else if (index > 0)
        {
            _flow.Rule(row.StartsGroup ? _flow.Ink.Rule : _flow.Ink.Hairline);
        }

        for (var i = 0; i < cells.Length; i++)
        {
            cells[i].Draw(_flow, _places[i].Left, _flow.Y + RowPad);
        }

        _flow.Y += height;
    }

    private (ImmutableArray<CellLayout> Cells, double Height) Layout(ImmutableArray<Cell> cells, Row row)
    {
        ImmutableArray<CellLayout> layouts =
            [.. cells.Select((c, i) => new CellLayout(c, _table.Columns[i].Align, _places[i].Width, _flow.Faces, row.IsTotal))];
        return (layouts, layouts.Max(l => l.Height) + 2 * RowPad);
    }

    private void Head(string after)
    {
        if (_table.Caption.Length > 0)
        {
            _flow.Draw(_table.Caption + after, _flow.Faces.Heading, _flow.Ink.Plain, _places[0].Left, _flow.Y + 4);
            _flow.Y += CaptionHeight;
        }

        var height = HeadHeight;
        for (var i = 0; i < _heads.Length; i++)
        {
            // Heads are small print standing on the rule, so that one and two lines end level.
            _heads[i].Draw(_flow, _places[i].Left, _flow.Y + height - RowPad - _heads[i].Height + _flow.Faces.Text.Line);
        }

        _flow.Y += height;
        _flow.Rule(_flow.Ink.Rule);
    }
}

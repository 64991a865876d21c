using HeadToWatts.Basis.Units;
using HeadToWatts.Drawings.Canvas;
using HeadToWatts.Drawings.Layout;

namespace HeadToWatts.Drawings;

/// <summary>One part of the head loss.</summary>
/// <param name="Name">The element or fitting.</param>
/// <param name="LossM">Head lost in it.</param>
/// <param name="IsFriction">True for friction along a pipe, false for a fitting.</param>
public readonly record struct LossShare(string Name, double LossM, bool IsFriction);

/// <summary>What the loss chart shows.</summary>
/// <param name="Shares">The parts in the order of the water.</param>
/// <param name="GrossHeadM">Gross head, to which they are compared.</param>
/// <param name="FlowM3PerS">The flow at which they are lost.</param>
public sealed record LossShareInput(IReadOnlyList<LossShare> Shares, double GrossHeadM, double FlowM3PerS);

/// <summary>Head lost in each element and fitting.</summary>
public static partial class LossShareChart
{
    private const int MostRows = 12;

    /// <summary>Draws the chart; its height follows from the number of parts, the size gives width and type.</summary>
    public static Drawing Draw(LossShareInput input, UnitDisplay show, DrawingSize size)
    {
        ArgumentNullException.ThrowIfNull(input);
        ArgumentNullException.ThrowIfNull(show);
        ArgumentNullException.ThrowIfNull(size);
        var type = size.Type;
        var canvas = new DrawingRecorder();
        var rows = Rows(input.Shares);
        var total = input.Shares.Sum(s => s.LossM);
        var most = rows.Select(r => r.LossM).DefaultIfEmpty(0).Max();
        var row = type.Label * 1.9;
        var values = rows.Select(r => Short(r.LossM) + (total > 0 ? ", " + ShareOf(r.LossM / total) : "")).ToList();
        var valueWidth = values.Select(v => TextMeasure.Width(v, type.Label)).DefaultIfEmpty(0).Max();
        var nameRoom = Math.Min(rows.Select(r => TextMeasure.Width(r.Name, type.Label)).DefaultIfEmpty(0).Max(), size.Width * 0.42);
        var left = 3 + nameRoom + 10;
        var room = Math.Max(10, size.Width - left - valueWidth - 14);
        for (var i = 0; i < rows.Count; i++)
        {
            var (part, y) = (rows[i], 4 + (i * row));
            var role = part.IsFriction ? InkRole.Ochre : InkRole.Soft;
            var width = most > 0 ? Math.Max(1, part.LossM / most * room) : 1;
            canvas.BeginMark($"{part.Name}: {values[i]} of the losses");
            canvas.Text(new Point(left - 8, y + (row * 0.62)), Shortened(part.Name, nameRoom, type.Label), new TextStyle(InkRole.Ink, type.Label, TextAnchor.End));
            canvas.Rectangle(new Point(left, y + (row * 0.16)), width, row * 0.6, Paint.Filled(role, part.IsFriction ? 1 : 0.7));
            canvas.Text(new Point(left + width + 6, y + (row * 0.62)), values[i], new TextStyle(InkRole.Soft, type.Label));
            canvas.EndMark();
        }

        var sumY = 4 + (rows.Count * row) + type.Strong;
        canvas.Line(new Point(left, 4), new Point(left, 4 + (rows.Count * row)), new Stroke(InkRole.Line));
        var sum = $"together {show.Length(total)}" + (input.GrossHeadM > 0 ? $", {Wording.Share(total / input.GrossHeadM)} of the gross head" : "");
        canvas.Text(new Point(Math.Min(left, size.Width - 4 - TextMeasure.Width(sum, type.Strong, TextWeight.SemiBold)), sumY), sum, new TextStyle(InkRole.Ochre, type.Strong, Weight: TextWeight.SemiBold));
        return canvas.Finish(
            "Where head is lost",
            $"At {show.Flow(input.FlowM3PerS)} the losses are {sum}: {string.Join("; ", rows.Select((r, i) => r.Name + " " + values[i]))}.",
            size.Width,
            sumY + (type.Strong * 0.6));

        string Short(double lossM) => UnitDisplay.In(lossM, show.LengthUnit, 2) + " " + show.LengthUnit.Symbol;

        static string ShareOf(double ratio) => ratio is > 0 and < 0.01 ? "< 1 %" : Wording.Share(ratio);
    }

    // Many small fittings are shown as one row, so that nothing is left out of the sum.
    private static IReadOnlyList<LossShare> Rows(IReadOnlyList<LossShare> shares)
    {
        if (shares.Count <= MostRows)
            return shares;
        var kept = shares.OrderByDescending(s => s.LossM).Take(MostRows - 1).ToHashSet();
        var rest = shares.Where(s => !kept.Contains(s)).ToList();
        return [.. shares.Where(kept.Contains), new LossShare($"{rest.Count} others", rest.Sum(s => s.LossM), false)];
    }

    private static string Shortened(string name, double room, double size)
    {
        var text = name;
        while (text.Length > 1 && TextMeasure.Width(text, size) > room)
            text = text.TrimEnd('…')[..^1].TrimEnd() + "…";
        return text;
    }
}

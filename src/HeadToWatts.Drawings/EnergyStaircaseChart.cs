using HeadToWatts.Basis.Units;
using HeadToWatts.Drawings.Canvas;
using HeadToWatts.Drawings.Layout;

namespace HeadToWatts.Drawings;

/// <summary>One step down of the staircase.</summary>
/// <param name="Name">What is lost.</param>
/// <param name="LossKwh">Energy lost, kWh a year.</param>
/// <param name="LeftKwh">Energy left after it, kWh a year.</param>
public readonly record struct StaircaseStep(string Name, double LossKwh, double LeftKwh);

/// <summary>What the staircase shows.</summary>
/// <param name="GrossKwh">Energy of the water through the turbines at the gross head, kWh a year.</param>
/// <param name="Steps">The steps down.</param>
public sealed record EnergyStaircaseInput(double GrossKwh, IReadOnlyList<StaircaseStep> Steps);

/// <summary>From the energy of the falling water down to the meter: a bar for each step, what is lost in ochre at its end.</summary>
public static partial class EnergyStaircaseChart
{
    /// <summary>Draws the chart; its height follows from the number of steps, the size gives width and type. Null where there is no energy.</summary>
    public static Drawing? Draw(EnergyStaircaseInput input, DrawingSize size)
    {
        ArgumentNullException.ThrowIfNull(input);
        ArgumentNullException.ThrowIfNull(size);
        if (!(input.GrossKwh > 0) || input.Steps.Count == 0 || input.Steps[^1].LeftKwh <= 0)
            return null;
        var steps = input.Steps.Where(s => Math.Abs(s.LossKwh) > input.GrossKwh * 1e-9).ToList();
        var type = size.Type;
        var canvas = new DrawingRecorder();
        var row = type.Label * 1.9;
        var names = steps.Select(s => s.Name).Prepend("falling water").Append("at the meter").ToList();
        var losses = steps.Select(s => UnitDisplay.Energy(s.LossKwh) + ", " + Share(s.LossKwh / input.GrossKwh)).ToList();
        var nameRoom = Math.Min(names.Max(n => TextMeasure.Width(n, type.Label)), size.Width * 0.42);
        var left = 3 + nameRoom + 10;
        var room = Math.Max(20, size.Width - left - 6);
        Bar(0, names[0], input.GrossKwh, 0, UnitDisplay.Energy(input.GrossKwh));
        for (var i = 0; i < steps.Count; i++)
            Bar(i + 1, steps[i].Name, Math.Max(0, steps[i].LeftKwh), Math.Max(0, steps[i].LossKwh), losses[i]);
        var end = steps.Count > 0 ? steps[^1].LeftKwh : input.GrossKwh;
        Bar(steps.Count + 1, names[^1], end, 0, UnitDisplay.Energy(end) + ", " + Share(end / input.GrossKwh));
        var bottom = 4 + (names.Count * row);
        canvas.Line(new Point(left, 4), new Point(left, bottom), new Stroke(InkRole.Line));
        return canvas.Finish(
            "From the water to the meter",
            $"Of {UnitDisplay.Energy(input.GrossKwh)} a year in the falling water {UnitDisplay.Energy(end)} reach the meter. Lost on the way: {string.Join("; ", steps.Select((s, i) => s.Name + " " + losses[i]))}.",
            size.Width,
            bottom + (type.Label * 0.4));

        void Bar(int i, string name, double keptKwh, double lostKwh, string value)
        {
            var y = 4 + (i * row);
            var kept = keptKwh / input.GrossKwh * room;
            var lost = lostKwh / input.GrossKwh * room;
            var isEnd = lostKwh == 0;
            canvas.BeginMark($"{name}: {value}");
            canvas.Text(new Point(left - 8, y + (row * 0.62)), Fitted(name, nameRoom, type.Label), new TextStyle(InkRole.Ink, type.Label, TextAnchor.End, isEnd ? TextWeight.SemiBold : TextWeight.Regular));
            canvas.Rectangle(new Point(left, y + (row * 0.16)), Math.Max(1, kept), row * 0.6, Paint.Filled(InkRole.Water, isEnd ? 0.55 : 0.18));
            if (lost > 0)
                canvas.Rectangle(new Point(left + kept, y + (row * 0.16)), Math.Max(1, lost), row * 0.6, Paint.Filled(InkRole.Ochre));
            Label(y, kept, kept + lost, value, isEnd);
            canvas.EndMark();
        }

        // Beside the bar where there is room, otherwise inside what is left of it.
        void Label(double y, double kept, double end, string value, bool strong)
        {
            var width = TextMeasure.Width(value, type.Label);
            var style = new TextStyle(strong ? InkRole.Ink : InkRole.Soft, type.Label);
            var baseline = y + (row * 0.62);
            if (end + 6 + width <= room)
                canvas.Text(new Point(left + end + 6, baseline), value, style);
            else
                canvas.Text(new Point(left + Math.Max(kept - 6, width + 2), baseline), value, style with { Role = InkRole.Ink, Anchor = TextAnchor.End });
        }

        static string Share(double ratio) => ratio is > 0 and < 0.01 ? "< 1 %" : Wording.Share(ratio);
    }

    private static string Fitted(string name, double room, double size)
    {
        var text = name;
        while (text.Length > 1 && TextMeasure.Width(text, size) > room)
            text = text.TrimEnd('…')[..^1].TrimEnd() + "…";
        return text;
    }
}

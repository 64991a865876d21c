using HeadToWatts.Basis.Quantities;
using HeadToWatts.Basis.Units;
using HeadToWatts.Drawings.Canvas;
using HeadToWatts.Drawings.Layout;
using HeadToWatts.Studies.Worth;

namespace HeadToWatts.Drawings;

/// <summary>One part of the capital cost.</summary>
/// <param name="Name">What it is.</param>
/// <param name="PartAmount">How much.</param>
/// <param name="IsAddition">True for what is added on top: contingency, engineering, interest.</param>
public readonly record struct CostPart(string Name, double PartAmount, bool IsAddition);

/// <summary>What the cost build-up shows.</summary>
/// <param name="Basis">Currency and price year.</param>
/// <param name="Parts">The parts in order; together the total.</param>
public sealed record CostBuildUpInput(MoneyBasis Basis, IReadOnlyList<CostPart> Parts);

/// <summary>The capital cost as steps: each part begins where the one above it ended, the whole stands below.</summary>
public static partial class CostBuildUpChart
{
    /// <summary>Draws the chart; its height follows from the number of parts. Null without a cost.</summary>
    public static Drawing? Draw(CostBuildUpInput input, DrawingSize size)
    {
        ArgumentNullException.ThrowIfNull(input);
        ArgumentNullException.ThrowIfNull(size);
        var parts = input.Parts.Where(p => p.PartAmount > 0).ToList();
        var total = parts.Sum(p => p.PartAmount);
        if (!(total > 0))
            return null;
        var type = size.Type;
        var canvas = new DrawingRecorder();
        var row = type.Label * 1.9;
        var whole = $"all, {input.Basis}";
        var nameRoom = Math.Min(parts.Select(p => p.Name).Append(whole).Max(n => TextMeasure.Width(n, type.Label, TextWeight.SemiBold)), size.Width * 0.42);
        var left = 3 + nameRoom + 10;
        var room = Math.Max(20, size.Width - left - 6);
        var from = 0.0;
        for (var i = 0; i < parts.Count; i++)
        {
            Bar(i, parts[i].Name, from, parts[i].PartAmount, parts[i].IsAddition ? Paint.Filled(InkRole.Ochre, 0.8) : Paint.Filled(InkRole.Water, 0.7), false);
            from += parts[i].PartAmount;
        }

        Bar(parts.Count, whole, 0, total, Paint.Filled(InkRole.Water, 0.35), true);
        var bottom = 4 + ((parts.Count + 1) * row);
        canvas.Line(new Point(left, 4), new Point(left, bottom), new Stroke(InkRole.Line));
        return canvas.Finish(
            "Capital cost",
            $"{MoneyText.WithYear(total, input.Basis)} in all: {string.Join("; ", parts.Select(p => $"{p.Name} {MoneyText.Amount(p.PartAmount, input.Basis)}, {Share(p.PartAmount / total)}"))}.",
            size.Width,
            bottom + (type.Label * 0.4));

        void Bar(int i, string name, double startAmount, double partAmount, Paint paint, bool strong)
        {
            var y = 4 + (i * row);
            var start = startAmount / total * room;
            var length = Math.Max(1, partAmount / total * room);
            var value = strong ? MoneyText.Amount(partAmount, input.Basis) : $"{UnitDisplay.Number(partAmount)}, {Share(partAmount / total)}";
            var width = TextMeasure.Width(value, type.Label);
            var style = new TextStyle(InkRole.Ink, type.Label);
            canvas.BeginMark($"{name}: {MoneyText.Amount(partAmount, input.Basis)}, {Share(partAmount / total)}");
            canvas.Text(new Point(left - 8, y + (row * 0.62)), BarNames.Fitted(name, nameRoom, type.Label, strong), new TextStyle(InkRole.Ink, type.Label, TextAnchor.End, strong ? TextWeight.SemiBold : TextWeight.Regular));
            canvas.Rectangle(new Point(left + start, y + (row * 0.16)), length, row * 0.6, paint);

            // To the right of the bar, else to its left, else on it.
            if (start + length + 6 + width <= room)
                canvas.Text(new Point(left + start + length + 6, y + (row * 0.62)), value, style);
            else if (start - 6 - width >= 2)
                canvas.Text(new Point(left + start - 6, y + (row * 0.62)), value, style with { Anchor = TextAnchor.End });
            else
                canvas.Text(new Point(left + start + length - 6, y + (row * 0.62)), value, style with { Anchor = TextAnchor.End, Halo = true });
            canvas.EndMark();
        }

        static string Share(double ratio) => ratio is > 0 and < 0.01 ? "< 1 %" : Wording.Share(ratio);
    }
}

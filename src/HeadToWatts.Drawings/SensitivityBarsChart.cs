using HeadToWatts.Basis.Quantities;
using HeadToWatts.Basis.Units;
using HeadToWatts.Drawings.Canvas;
using HeadToWatts.Drawings.Layout;
using HeadToWatts.Studies.Worth;

namespace HeadToWatts.Drawings;

/// <summary>What the sensitivity bars show.</summary>
/// <param name="Basis">Currency and price year.</param>
/// <param name="PlannedAmount">Net present value as planned.</param>
/// <param name="Bars">One thing at a time, the widest first.</param>
public sealed record SensitivityInput(MoneyBasis Basis, double PlannedAmount, IReadOnlyList<SensitivityBar> Bars);

/// <summary>What becomes of the net present value when one thing alone is changed; a line marks where gain turns into loss.</summary>
public static partial class SensitivityBarsChart
{
    /// <summary>Draws the chart; its height follows from the number of bars. Null without bars.</summary>
    public static Drawing? Draw(SensitivityInput input, DrawingSize size)
    {
        ArgumentNullException.ThrowIfNull(input);
        ArgumentNullException.ThrowIfNull(size);
        if (input.Bars.Count == 0)
            return null;
        var type = size.Type;
        var canvas = new DrawingRecorder();
        var row = type.Label * 1.95;
        var nameRoom = Math.Min(input.Bars.Max(b => TextMeasure.Width(b.Name, type.Label)), size.Width * 0.34);
        var changeRoom = input.Bars.Max(b => Math.Max(TextMeasure.Width(b.WorseText, type.Tick), TextMeasure.Width(b.BetterText, type.Tick))) + 5;
        var left = 3 + nameRoom + 8 + changeRoom;
        var right = size.Width - changeRoom - 3;
        var low = Math.Min(0, Math.Min(input.PlannedAmount, input.Bars.Min(b => b.WorseAmount)));
        var high = Math.Max(0, Math.Max(input.PlannedAmount, input.Bars.Max(b => b.BetterAmount)));
        double At(double amount) => left + ((amount - low) / (high - low) * (right - left));
        var top = type.Label * 1.7;
        var bottom = top + (input.Bars.Count * row);
        var height = bottom + (type.Label * 1.7);

        canvas.Line(new Point(At(0), top - 2), new Point(At(0), bottom + 2), new Stroke(InkRole.Soft, 1.2, Dash.Dashed));
        for (var i = 0; i < input.Bars.Count; i++)
        {
            var bar = input.Bars[i];
            var y = top + (i * row);
            var (worse, planned, better) = (At(bar.WorseAmount), At(input.PlannedAmount), At(bar.BetterAmount));
            canvas.BeginMark($"{bar.Name}: {MoneyText.Amount(bar.WorseAmount, input.Basis)} at {bar.WorseText}, {MoneyText.Amount(bar.BetterAmount, input.Basis)} at {bar.BetterText}");
            canvas.Text(new Point(3 + nameRoom, y + (row * 0.64)), BarNames.Fitted(bar.Name, nameRoom, type.Label), new TextStyle(InkRole.Ink, type.Label, TextAnchor.End));
            canvas.Rectangle(new Point(worse, y + (row * 0.18)), Math.Max(0.5, planned - worse), row * 0.58, Paint.Filled(InkRole.Ochre, 0.85));
            canvas.Rectangle(new Point(planned, y + (row * 0.18)), Math.Max(0.5, better - planned), row * 0.58, Paint.Filled(InkRole.Water, 0.75));
            canvas.Text(new Point(worse - 4, y + (row * 0.64)), bar.WorseText, new TextStyle(InkRole.Soft, type.Tick, TextAnchor.End, Halo: true));
            canvas.Text(new Point(better + 4, y + (row * 0.64)), bar.BetterText, new TextStyle(InkRole.Soft, type.Tick, Halo: true));
            canvas.EndMark();
        }

        canvas.Line(new Point(At(input.PlannedAmount), top - 2), new Point(At(input.PlannedAmount), bottom + 2), new Stroke(InkRole.Ink, 1.2));
        Centred("as planned " + MoneyText.Amount(input.PlannedAmount, input.Basis), At(input.PlannedAmount), type.Label * 1.05, InkRole.Ink);
        Centred("neither gain nor loss", At(0), bottom + (type.Label * 1.3), InkRole.Soft);
        return canvas.Finish(
            "One thing at a time",
            $"Net present value {MoneyText.WithYear(input.PlannedAmount, input.Basis)} as planned. {string.Join("; ", input.Bars.Select(b => $"{b.Name} {b.WorseText} {UnitDisplay.Number(b.WorseAmount)}, {b.BetterText} {UnitDisplay.Number(b.BetterAmount)}"))}.",
            size.Width,
            height);

        void Centred(string text, double x, double y, InkRole role)
        {
            var half = TextMeasure.Width(text, type.Label) / 2;
            canvas.Text(new Point(Math.Clamp(x, half + 3, size.Width - half - 3), y), text, new TextStyle(role, type.Label, TextAnchor.Middle));
        }
    }
}

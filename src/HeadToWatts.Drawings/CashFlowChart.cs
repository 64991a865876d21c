using System.Globalization;
using HeadToWatts.Basis.Quantities;
using HeadToWatts.Drawings.Axes;
using HeadToWatts.Drawings.Canvas;
using HeadToWatts.Drawings.Layout;
using HeadToWatts.Studies.Worth;

namespace HeadToWatts.Drawings;

/// <summary>What the cash-flow chart shows.</summary>
/// <param name="Basis">Currency and price year.</param>
/// <param name="Terms">The terms in words.</param>
/// <param name="YearlyAmounts">Cash of each year, the start of operation first.</param>
/// <param name="PaybackYears">When the sum of the cash reaches zero; null when never.</param>
public sealed record CashFlowInput(MoneyBasis Basis, string Terms, IReadOnlyList<double> YearlyAmounts, double? PaybackYears);

/// <summary>Cash of every year as bars, and their running sum as a line that crosses zero at the payback.</summary>
public static partial class CashFlowChart
{
    /// <summary>Draws the chart; null where there is no cash at all.</summary>
    public static Drawing? Draw(CashFlowInput input, DrawingSize size)
    {
        ArgumentNullException.ThrowIfNull(input);
        ArgumentNullException.ThrowIfNull(size);
        var yearly = input.YearlyAmounts;
        if (yearly.Count < 2 || yearly.All(a => a == 0))
            return null;
        var sums = new double[yearly.Count];
        for (var i = 0; i < sums.Length; i++)
            sums[i] = yearly[i] + (i > 0 ? sums[i - 1] : 0);
        var most = Math.Max(0, Math.Max(yearly.Max(), sums.Max()));
        var least = Math.Min(0, Math.Min(yearly.Min(), sums.Min()));
        var (scale, word) = Math.Max(most, -least) switch { >= 2e7 => (1e6, "million "), >= 2e4 => (1e3, "thousand "), _ => (1.0, "") };
        var frame = ChartFrame.Begin(
            size,
            Axis.Linear("year of operation", -0.6, yearly.Count - 0.4, ChartFrame.HorizontalIntervals(size, 2), toTicks: false),
            Axis.Linear($"{word}{input.Basis.Currency} of {Year(input.Basis)}", least / scale, most > least ? most / scale : 1, ChartFrame.VerticalIntervals(size)));
        var slot = frame.AtX(1) - frame.AtX(0);
        var zero = frame.AtY(0);
        for (var i = 0; i < yearly.Count; i++)
        {
            var top = frame.AtY(Math.Max(0, yearly[i] / scale));
            var bottom = frame.AtY(Math.Min(0, yearly[i] / scale));
            if (bottom > top)
                frame.Canvas.Rectangle(new Point(frame.AtX(i) - (slot * 0.33), top), slot * 0.66, bottom - top, Paint.Filled(yearly[i] < 0 ? InkRole.Ochre : InkRole.Water, 0.75));
        }

        frame.Canvas.Line(new Point(frame.Left, zero), new Point(frame.Right, zero), new Stroke(InkRole.Soft));
        Point[] line = [.. sums.Select((s, i) => new Point(frame.AtX(i), frame.AtY(s / scale)))];
        frame.Curve(line, new Stroke(InkRole.Ink, 1.8));
        if (input.PaybackYears is { } payback && payback > 0)
        {
            frame.Canvas.Circle(new Point(frame.AtX(payback), zero), 4, new Paint(new Fill(InkRole.Card), new Stroke(InkRole.Ink, 1.8)));
            frame.Labels.TryPlace(frame.Canvas, "paid back after " + MoneyText.Years(payback), frame.StrongStyle(InkRole.Ink), Around(new Point(frame.AtX(payback), zero), size.Type.Strong));
        }

        frame.Labels.TryPlace(frame.Canvas, "running sum", frame.LabelStyle(InkRole.Ink), Spots.AlongCurve(line, size.Type.Label, 0.8));
        frame.HoverBands([.. yearly.Select((a, i) => (line[i], $"year {i.ToString(CultureInfo.InvariantCulture)}: {MoneyText.Amount(a, input.Basis)}; sum {MoneyText.Amount(sums[i], input.Basis)}"))]);
        return frame.Canvas.Finish(
            "Cash by year",
            $"{MoneyText.Amount(yearly[0], input.Basis)} at the start, {MoneyText.Amount(yearly[1], input.Basis)} in the first year, {MoneyText.Amount(sums[^1], input.Basis)} in all after {yearly.Count - 1} years ({input.Terms}, without discounting); {(input.PaybackYears is { } p ? "paid back after " + MoneyText.Years(p) : "never paid back")}.",
            size.Width,
            size.Height);
    }

    private static IReadOnlyList<LabelSpot> Around(Point at, double type) =>
    [
        new(new Point(at.X + 8, at.Y + (type * 1.5)), TextAnchor.Start),
        new(new Point(at.X - 8, at.Y - (type * 0.9)), TextAnchor.End),
        new(new Point(at.X - 8, at.Y + (type * 1.5)), TextAnchor.End),
        new(new Point(at.X + 8, at.Y + (type * 2.8)), TextAnchor.Start),
        new(new Point(at.X - 8, at.Y - (type * 2.4)), TextAnchor.End),
    ];

    private static string Year(MoneyBasis basis) => basis.PriceYear.ToString(CultureInfo.InvariantCulture);
}

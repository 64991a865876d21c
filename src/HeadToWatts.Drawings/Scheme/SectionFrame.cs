using HeadToWatts.Basis.Units;
using HeadToWatts.Drawings.Axes;
using HeadToWatts.Drawings.Canvas;
using HeadToWatts.Drawings.Layout;

namespace HeadToWatts.Drawings.Scheme;

/// <summary>Levels at the left, distances below, and the scales said in words.</summary>
internal static class SectionFrame
{
    public static void Draw(ICanvas canvas, LabelPlacer labels, SchemeSectionInput input, SectionLayout at, PipeOutline pipe, UnitDisplay show, DrawingSize size)
    {
        var type = size.Type;
        var unit = show.LengthUnit;
        var tick = new TextStyle(InkRole.Soft, type.Tick, TextAnchor.End);

        double Level(double y) => unit.FromHeld(input.HeadwaterM - ((y - at.HeadwaterY) / at.VerticalScale));
        var (low, high) = (Level(at.Bottom), Level(at.Y(input.TopM) - (type.Tick * 0.8)));
        var step = Ticks.Step(high - low, ChartFrame.VerticalIntervals(size));
        foreach (var level in Ticks.Linear(low, high, step))
        {
            var y = at.HeadwaterY + ((input.HeadwaterM - unit.ToHeld(level.Value)) * at.VerticalScale);
            canvas.Line(new Point(at.Left, y), new Point(at.Right, y), new Stroke(InkRole.Grid));
            if (y < at.Bottom - 2)
                labels.Fix(canvas, new Point(at.Left - 7, y + (type.Tick * 0.36)), level.Text, tick);
        }

        var title = input.LevelsAreKnown ? "elevation, " : "height above tailwater, ";
        labels.Fix(canvas, new Point(3, at.Top - (type.Label * 0.85)), title + unit.Symbol, new TextStyle(InkRole.Soft, type.Label));
        if (at.HasRun)
            Distances(canvas, labels, at, pipe, unit, size);
    }

    private static void Distances(ICanvas canvas, LabelPlacer labels, SectionLayout at, PipeOutline pipe, UnitOfMeasure unit, DrawingSize size)
    {
        var type = size.Type;
        var run = unit.FromHeld(at.RunM);
        var room = at.MachineX - at.IntakeX;
        var intervals = Math.Clamp((int)(room / (TextMeasure.Width(Ticks.Text(run, 1), type.Tick) + 22)), 1, 10);
        var end = double.NegativeInfinity;
        foreach (var distance in Ticks.Linear(0, run, Ticks.Step(run, intervals)))
        {
            var x = at.XOfDistance(unit.ToHeld(distance.Value));
            var half = TextMeasure.Width(distance.Text, type.Tick) / 2;
            if (x - half < end + 3)
                continue;
            end = x + half;
            canvas.Line(new Point(x, at.Bottom), new Point(x, at.Bottom + 3.5), new Stroke(InkRole.Soft, 0.8));
            labels.Fix(canvas, new Point(x, at.Bottom + (type.Tick * 1.4)), distance.Text, new TextStyle(InkRole.Soft, type.Tick, TextAnchor.Middle));
        }

        var ratio = UnitDisplay.Number(at.HeightRatio, at.HeightRatio == Math.Floor(at.HeightRatio) ? 1 : 2);
        var scale = at.HeightRatio > 1 ? $"heights drawn {ratio} times larger" : "heights and distances to one scale";
        var shortScale = at.HeightRatio > 1 ? $"heights × {ratio}" : "one scale";
        var wide = pipe.IsToScale ? "" : "; pipe drawn wider";
        string[] texts =
        [
            $"distance from the intake, {unit.Symbol}; {scale}{wide}",
            $"distance, {unit.Symbol}; {scale}{wide}",
            $"distance, {unit.Symbol}; {shortScale}{wide}",
            $"distance, {unit.Symbol}; {shortScale}",
        ];
        var style = new TextStyle(InkRole.Soft, type.Label);
        var text = Array.Find(texts, t => TextMeasure.Width(t, style) < size.Width - at.Left - 4) ?? texts[^1];
        var start = Math.Min(at.IntakeX, size.Width - 4 - TextMeasure.Width(text, style));
        labels.Fix(canvas, new Point(Math.Max(3, start), at.Bottom + (type.Tick * 1.5) + (type.Label * 1.3)), text, style);
    }
}

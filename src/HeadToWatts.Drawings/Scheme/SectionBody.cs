using HeadToWatts.Drawings.Canvas;
using HeadToWatts.Drawings.Layout;

namespace HeadToWatts.Drawings.Scheme;

/// <summary>Ground, water, intake, pipes and powerhouse.</summary>
internal static class SectionBody
{
    private const double CrestRise = 5;
    private const double CrestWidth = 12;
    private const double HeadwallWidth = 5;

    public static void Draw(ICanvas canvas, LabelPlacer labels, SchemeSectionInput input, SectionLayout at, PipeOutline pipe)
    {
        var poolBed = Math.Min(pipe.Lower.Count > 0 ? Math.Max(pipe.Lower[0].Y + 3, at.HeadwaterY + 22) : at.HeadwaterY + 34, at.Bottom - 14);
        var tailBed = Math.Min(at.TailwaterY + 24, at.Bottom - 4);
        Ground(canvas, labels, input, at, pipe, poolBed, tailBed);

        canvas.Polygon([new(at.Left, at.HeadwaterY), new(at.IntakeX, at.HeadwaterY), new(at.IntakeX, poolBed), new(at.Left, poolBed)], Paint.Filled(InkRole.WaterFill));
        canvas.Polygon(
            [new(at.HouseRight - 2, at.TailwaterY), new(at.Right, at.TailwaterY), new(at.Right, tailBed), new(at.HouseRight + 14, tailBed), new(at.HouseRight - 2, at.TailwaterY + 10)],
            Paint.Filled(InkRole.WaterFill));

        if (pipe.Upper.Count > 0)
        {
            canvas.Polygon([.. pipe.Upper, .. pipe.Lower.Reverse()], Paint.Filled(InkRole.WaterFill));
            canvas.Polyline(pipe.Upper, new Stroke(InkRole.Ink, 1.5));
            canvas.Polyline(pipe.Lower, new Stroke(InkRole.Ink, 1.5));
            labels.AvoidLines(pipe.Upper, 2);
            labels.AvoidLines(pipe.Lower, 2);
        }

        else
        {
            Passage(canvas, labels, at, poolBed);
        }

        Intake(canvas, labels, at, pipe, poolBed);
        House(canvas, labels, input, at);

        Surface(canvas, labels, at.Left, at.IntakeX, at.HeadwaterY);
        Surface(canvas, labels, at.HouseRight, at.Right, at.TailwaterY);
    }

    private static void Ground(ICanvas canvas, LabelPlacer labels, SchemeSectionInput input, SectionLayout at, PipeOutline pipe, double poolBed, double tailBed)
    {
        var houseLeft = at.MachineX - at.HouseHalf;
        var surface = new List<Point>
        {
            new(at.Left, poolBed),
            new(at.IntakeX, poolBed),
            new(at.IntakeX, at.HeadwaterY - CrestRise),
        };
        if (pipe.Centres.Count == 0)
        {
            surface.Add(new(at.IntakeX + CrestWidth, at.HeadwaterY - CrestRise));
            surface.Add(new(houseLeft, at.MachineY - (at.HouseHalf * 0.8)));
            surface.Add(new(houseLeft, at.TailwaterY + 10));
        }
        else
        {
            // Bank behind the headwall down to the pipe, then half over the pipe.
            var centre = pipe.Centres.SelectMany(c => new[] { c.From, c.To }).ToList();
            const int steps = 40;
            var fall = (centre[^1].Y - centre[0].Y) / Math.Max(1, centre[^1].X - centre[0].X);
            surface.Add(new(Math.Min(at.IntakeX + CrestWidth, houseLeft), at.HeadwaterY - CrestRise));
            for (var i = 0; i <= steps; i++)
            {
                var x = at.IntakeX + CrestWidth + ((houseLeft - at.IntakeX - CrestWidth) * i / steps);
                if (x < at.IntakeX + CrestWidth)
                    break;
                var bank = at.HeadwaterY - CrestRise + ((x - at.IntakeX - CrestWidth) * Math.Max(0.75, fall * 1.3));
                surface.Add(new(x, Math.Min(bank, Spots.HeightAt(centre, x) + 1)));
            }
        }

        surface.Add(new(at.MachineX, at.TailwaterY + 10));
        surface.Add(new(at.HouseRight - 2, at.TailwaterY + 10));
        surface.Add(new(at.HouseRight + 14, tailBed));
        surface.Add(new(at.Right, tailBed));
        surface.Add(new(at.Right, at.Bottom));
        surface.Add(new(at.Left, at.Bottom));
        canvas.Polygon(surface, Paint.Filled(InkRole.Ground));
        labels.AvoidLines([.. surface.Skip(2).SkipLast(6)], 0.6);
    }

    // Without a pipe the water still has to get to the machine: a short passage through the sill.
    private static void Passage(ICanvas canvas, LabelPlacer labels, SectionLayout at, double poolBed)
    {
        var half = at.HouseHalf * 0.38;
        Point[] roof = [new(at.IntakeX, at.HeadwaterY + 8), new(at.IntakeX + 14, at.HeadwaterY + 8), new(at.MachineX - at.HouseHalf, at.MachineY - half)];
        Point[] floor = [new(at.IntakeX, poolBed - 6), new(at.IntakeX + 6, poolBed - 6), new(at.MachineX - at.HouseHalf, at.MachineY + half)];
        canvas.Polygon([.. roof, .. floor.Reverse()], Paint.Filled(InkRole.WaterFill));
        canvas.Polyline(roof, new Stroke(InkRole.Ink, 1.5));
        canvas.Polyline(floor, new Stroke(InkRole.Ink, 1.5));
        labels.AvoidLines(roof, 2);
        labels.AvoidLines(floor, 2);
    }

    private static void Intake(ICanvas canvas, LabelPlacer labels, SectionLayout at, PipeOutline pipe, double poolBed)
    {
        // Headwall, open where the pipe begins.
        var opening = pipe.Upper.Count > 0 ? (Top: pipe.Upper[0].Y, Bottom: pipe.Lower[0].Y) : (Top: at.HeadwaterY + 8, Bottom: poolBed - 6);
        Wall(at.HeadwaterY - CrestRise - 3, Math.Max(opening.Top, at.HeadwaterY));
        Wall(opening.Bottom, poolBed);

        var top = new Point(at.IntakeX - 5, at.HeadwaterY - 7);
        var foot = new Point(at.IntakeX - 15, poolBed);
        canvas.BeginMark("trash rack");
        canvas.Line(foot, top, new Stroke(InkRole.Ink, 2.2, Dash.Dotted));
        canvas.EndMark();
        labels.AvoidLines([foot, top]);

        void Wall(double from, double to)
        {
            if (to - from < 9)
                return;
            labels.AvoidLines([new(at.IntakeX, from), new(at.IntakeX, to)], 3);
            canvas.Rectangle(new Point(at.IntakeX - (HeadwallWidth / 2), from), HeadwallWidth, to - from, new Paint(new Fill(InkRole.Card), new Stroke(InkRole.Ink)));
        }
    }

    private static void House(ICanvas canvas, LabelPlacer labels, SchemeSectionInput input, SectionLayout at)
    {
        var (left, right) = (at.MachineX - at.HouseHalf, at.HouseRight);
        var radius = at.HouseHalf * 0.42;
        var eaves = at.MachineY - (at.HouseHalf * 1.5);
        var foot = at.TailwaterY + 13;
        canvas.BeginMark(input.Machine + (input.MeterPowerKw > 0 ? ": " + Basis.Units.UnitDisplay.Power(input.MeterPowerKw) : ": stands"));
        canvas.Polygon([new(left, foot), new(left, eaves), new(at.MachineX, eaves - (at.HouseHalf * 0.75)), new(right, eaves), new(right, foot)], new Paint(new Fill(InkRole.Card), new Stroke(InkRole.Ink, 1.5)));
        canvas.Circle(new Point(at.MachineX, at.MachineY), radius, new Paint(null, new Stroke(InkRole.Ochre, 3)));
        canvas.Circle(new Point(at.MachineX, at.MachineY), radius * 0.3, Paint.Filled(InkRole.Ochre));
        canvas.EndMark();
        labels.Avoid(LabelBox.Of(new Point(left, eaves - (at.HouseHalf * 0.5)), right - left, foot - eaves + (at.HouseHalf * 0.5)));
    }

    private static void Surface(ICanvas canvas, LabelPlacer labels, double from, double to, double y)
    {
        canvas.Line(new Point(from, y), new Point(to, y), new Stroke(InkRole.Water, 1.6));
        labels.AvoidLines([new(from, y), new(to, y)]);
    }
}

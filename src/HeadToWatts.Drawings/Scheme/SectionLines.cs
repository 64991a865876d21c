using HeadToWatts.Basis.Units;
using HeadToWatts.Drawings.Canvas;
using HeadToWatts.Drawings.Layout;

namespace HeadToWatts.Drawings.Scheme;

/// <summary>Grade lines, dimension lines and what they show on hover.</summary>
internal static class SectionLines
{
    private const int HoverBands = 28;

    public static (IReadOnlyList<Point> Energy, IReadOnlyList<Point> Hydraulic) Draw(ICanvas canvas, LabelPlacer labels, SchemeSectionInput input, SectionLayout at)
    {
        var (headwaterY, machineY) = (at.HeadwaterY, at.Y(input.EnergyAtMachineM));
        List<Point> energy = [new(at.IntakeX, headwaterY)];
        var hydraulic = new List<Point>();
        var stationM = 0.0;
        for (var i = 0; i < input.Grades.Count; i++)
        {
            if (i % 2 == 1)
                stationM += input.Pipes[i / 2].LengthM;
            var x = at.X(stationM);
            energy.Add(new Point(x, at.Y(input.Grades[i].EnergyGradeM)));
            hydraulic.Add(new Point(x, at.Y(input.Grades[i].HydraulicGradeM)));
        }

        if (input.Pipes.Count == 0)
            energy.Add(new Point(at.MachineX, machineY));

        Extension(at.IntakeX, at.GrossX + 3, headwaterY);
        Extension(at.MachineX, at.NetX + 4, machineY);
        if (hydraulic.Count > 0)
        {
            canvas.Polyline(hydraulic, new Stroke(InkRole.Water, 1.8, Dash.Dashed));
            labels.AvoidLines(hydraulic);
        }

        canvas.Line(new Point(at.Left, headwaterY), energy[0], new Stroke(InkRole.Ochre, 1.8));
        canvas.Polyline(energy, new Stroke(InkRole.Ochre, 1.8));
        labels.AvoidLines(energy);

        var netBottom = at.Y(input.EnergyAtMachineM - Math.Max(0, input.NetHeadM));
        if (input.NetHeadM > 0)
            Dimension.Draw(canvas, at.NetX, machineY, netBottom, InkRole.Ink);
        Loss(headwaterY, machineY);
        Loss(netBottom, at.TailwaterY);
        if (input.GrossHeadM > 0)
            Dimension.Draw(canvas, at.GrossX, headwaterY, at.TailwaterY, InkRole.Ink);
        labels.AvoidLines([new(at.NetX, headwaterY), new(at.NetX, at.TailwaterY)], 3);
        labels.AvoidLines([new(at.GrossX, headwaterY), new(at.GrossX, at.TailwaterY)], 3);
        return (energy, hydraulic);

        void Loss(double from, double to)
        {
            if (to - from > 0.8)
                Dimension.Draw(canvas, at.NetX, from, to, InkRole.Ochre);
        }

        void Extension(double from, double to, double y)
        {
            canvas.Line(new Point(from, y), new Point(to, y), new Stroke(InkRole.Soft, 0.8, Dash.Dotted));
            labels.AvoidLines([new(from, y), new(to, y)], 0.5);
        }
    }

    /// <summary>Bands along the pipe that show energy and pressure at their place.</summary>
    public static void Hover(ICanvas canvas, SchemeSectionInput input, SectionLayout at, UnitDisplay show)
    {
        if (input.Pipes.Count == 0)
            return;
        var lengthM = input.Pipes.Sum(p => p.LengthM);
        var width = (at.MachineX - at.HouseHalf - at.IntakeX) / HoverBands;
        if (!(width > 0) || !(lengthM > 0))
            return;
        for (var i = 0; i < HoverBands; i++)
        {
            var place = At(input, lengthM * (i + 0.5) / HoverBands);
            var x = at.X(place.StationM);
            canvas.HoverArea(
                new Point(x - (width / 2), at.HeadwaterY),
                width,
                at.Bottom - at.HeadwaterY,
                new Point(x, at.Y(place.HydraulicGradeM)),
                $"{show.Length(place.StationM)} along the pipe: energy line {SectionLabels.Level(place.EnergyGradeM, show)}, pressure head {show.Length(place.HydraulicGradeM - place.CentreLevelM)} at the centre");
        }
    }

    private static GradePoint At(SchemeSectionInput input, double stationM)
    {
        var start = 0.0;
        for (var i = 0; i < input.Pipes.Count; i++)
        {
            var length = input.Pipes[i].LengthM;
            if (stationM <= start + length || i == input.Pipes.Count - 1)
            {
                var (a, b) = (input.Grades[2 * i], input.Grades[(2 * i) + 1]);
                var t = length > 0 ? Math.Clamp((stationM - start) / length, 0, 1) : 0;
                return new GradePoint(
                    stationM,
                    a.CentreLevelM + (t * (b.CentreLevelM - a.CentreLevelM)),
                    a.HydraulicGradeM + (t * (b.HydraulicGradeM - a.HydraulicGradeM)),
                    a.EnergyGradeM + (t * (b.EnergyGradeM - a.EnergyGradeM)));
            }

            start += length;
        }

        throw new ArgumentException("There is no pipe.", nameof(input));
    }
}

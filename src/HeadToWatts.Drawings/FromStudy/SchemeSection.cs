using HeadToWatts.Basis.Units;
using HeadToWatts.Drawings.Canvas;
using HeadToWatts.Drawings.Scheme;
using HeadToWatts.EnergyYield;
using HeadToWatts.Studies;

namespace HeadToWatts.Drawings;

public static partial class SchemeSection
{
    private const int ScaleSteps = 20;

    /// <summary>Draws the section of a study.</summary>
    /// <param name="result">The study.</param>
    /// <param name="show">Units in which numbers are shown.</param>
    /// <param name="size">Size of the drawing.</param>
    /// <param name="usableFlowM3PerS">Flow offered to the plant, m3/s, 0 or more; the design flow when omitted.</param>
    public static Drawing Draw(StudyResult result, UnitDisplay show, DrawingSize size, double? usableFlowM3PerS = null) =>
        Draw(InputOf(result, usableFlowM3PerS), show, size);

    /// <summary>What the section of a study shows.</summary>
    /// <param name="result">The study.</param>
    /// <param name="usableFlowM3PerS">Flow offered to the plant, m3/s, 0 or more; the design flow when omitted.</param>
    public static SchemeSectionInput InputOf(StudyResult result, double? usableFlowM3PerS = null)
    {
        ArgumentNullException.ThrowIfNull(result);
        var usable = usableFlowM3PerS ?? result.Flow.DesignFlowM3PerS;
        var plant = result.Energy.Plant;
        var head = result.Head;
        var point = plant.At(usable);
        var flow = point.TurbineFlowM3PerS;
        var waterway = result.Waterway.Waterway;
        var losses = waterway.At(flow, result.Site);

        // Where the levels move with the flow, the water moves and the pipe stays. A drowned fall is drawn as none.
        var headwaterM = plant.Design.MovingHead?.HeadwaterM(usable) ?? head.HeadwaterM;
        var tailwaterM = Math.Min(plant.Design.MovingHead?.TailwaterM(usable) ?? head.TailwaterM, headwaterM);
        var sections = waterway.GradeLines(flow, headwaterM, tailwaterM, result.Site);

        // Headwater first, machine and tailwater last; between them a start and an end for each pipe.
        return new SchemeSectionInput(
            flow,
            headwaterM,
            tailwaterM,
            result.Input.Head.IsFromLevels,
            point.IsRunning ? point.NetHeadM : headwaterM - tailwaterM,
            [.. losses.Elements.Select(e => new SectionPipe(e.Element.Name, e.Element.LengthM, e.Element.InsideDiameterM, e.VelocityMPerS))],
            [.. sections.Zip(result.Waterway.GradeLines).Skip(1).SkipLast(2).Select(s => new GradePoint(
                s.First.StationM, s.Second.CentreElevationM, s.First.HydraulicGradeM, s.First.EnergyGradeM))],
            $"{result.Turbine.Chosen.Type.Name} × {result.Turbine.Units.UnitCount}",
            point.MeterPowerKw)
        {
            HighestHeadwaterM = Everywhere(m => m.HeadwaterM, head.HeadwaterM).Append(headwaterM).Max(),
            LowestTailwaterM = Everywhere(m => m.TailwaterM, head.TailwaterM).Append(tailwaterM).Min(),
        };

        // The scale is that of the whole range of flows, so that it does not move with the one shown.
        IEnumerable<double> Everywhere(Func<MovingHead, Func<double, double>> level, double atDesignM)
        {
            if (plant.Design.MovingHead is not { } moving)
                return [atDesignM];
            var largest = Math.Max(result.Flow.Supply.UsableM3PerS[0], result.Flow.DesignFlowM3PerS);
            return Enumerable.Range(0, ScaleSteps + 1).Select(i => level(moving)(largest * i / ScaleSteps)).Append(atDesignM);
        }
    }
}

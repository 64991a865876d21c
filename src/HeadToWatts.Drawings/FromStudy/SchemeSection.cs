using HeadToWatts.Basis.Units;
using HeadToWatts.Drawings.Canvas;
using HeadToWatts.Drawings.Scheme;
using HeadToWatts.Studies;

namespace HeadToWatts.Drawings;

public static partial class SchemeSection
{
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
        var point = result.Energy.Plant.At(usableFlowM3PerS ?? result.Flow.DesignFlowM3PerS);
        var flow = point.TurbineFlowM3PerS;
        var losses = result.Waterway.Waterway.At(flow, result.Site);
        var sections = result.Waterway.Waterway.GradeLines(flow, result.Head.HeadwaterM, result.Head.TailwaterM, result.Site);

        // Headwater first, machine and tailwater last; between them a start and an end for each pipe.
        return new SchemeSectionInput(
            flow,
            result.Head.HeadwaterM,
            result.Head.TailwaterM,
            result.Input.Head.IsFromLevels,
            point.NetHeadM,
            [.. losses.Elements.Select(e => new SectionPipe(e.Element.Name, e.Element.LengthM, e.Element.InsideDiameterM, e.VelocityMPerS))],
            [.. sections.Skip(1).SkipLast(2).Select(s => new GradePoint(s.StationM, s.CentreElevationM, s.HydraulicGradeM, s.EnergyGradeM))],
            $"{result.Turbine.Chosen.Type.Name} × {result.Turbine.Units.UnitCount}",
            point.MeterPowerKw);
    }
}

using HeadToWatts.Basis.Units;
using HeadToWatts.Drawings.Axes;
using HeadToWatts.Drawings.Canvas;
using HeadToWatts.Drawings.Layout;
using HeadToWatts.Drawings.Scheme;

namespace HeadToWatts.Drawings;

/// <summary>
/// The section through the scheme at one flow: water, ground, rack, pipes, machine, energy and hydraulic grade lines, and the
/// heads dimensioned. Levels and lengths are to scale; the ground beside the pipe is a sketch.
/// </summary>
public static partial class SchemeSection
{
    /// <summary>Draws the section.</summary>
    /// <exception cref="ArgumentException">There are not two grade points for each pipe, or no fall.</exception>
    public static Drawing Draw(SchemeSectionInput input, UnitDisplay show, DrawingSize size)
    {
        ArgumentNullException.ThrowIfNull(input);
        ArgumentNullException.ThrowIfNull(show);
        ArgumentNullException.ThrowIfNull(size);
        if (input.Grades.Count != input.Pipes.Count * 2)
            throw new ArgumentException("Two grade points for each pipe.", nameof(input));
        if (!(input.TopM > input.FootM) || !(input.GrossHeadM >= 0))
            throw new ArgumentException("The headwater lies above the tailwater.", nameof(input));

        var at = new SectionLayout(input, show, size);
        var canvas = new DrawingRecorder();
        var labels = new LabelPlacer(2, 2, size.Width - 2, size.Height - 2);
        var pipe = PipeOutline.Of(input, at);
        SectionFrame.Draw(canvas, labels, input, at, pipe, show, size);
        SectionBody.Draw(canvas, labels, input, at, pipe);
        var (energy, hydraulic) = SectionLines.Draw(canvas, labels, input, at);
        SectionLabels.Draw(canvas, labels, input, at, pipe, energy, hydraulic, show, size.Type);
        SectionLines.Hover(canvas, input, at, show);
        return canvas.Finish("Section through the scheme", Describe(input, at, pipe, show), size.Width, size.Height);
    }

    private static string Describe(SchemeSectionInput input, SectionLayout at, PipeOutline pipe, UnitDisplay show)
    {
        var text = $"At {show.Flow(input.FlowM3PerS)}: gross head {show.Length(input.GrossHeadM)}, losses {SectionLabels.Loss(input, show)}, net head {show.Length(input.NetHeadM)}. ";
        if (input.LevelsAreKnown)
            text += $"Headwater at {SectionLabels.Level(input.HeadwaterM, show)}, tailwater at {SectionLabels.Level(input.TailwaterM, show)}. ";
        text += input.Pipes.Count == 0
            ? "The machine stands at the drop, without a pipe. "
            : string.Concat(input.Pipes.Select(p => $"{p.Name}, {Wording.Trimmed(show.Length(p.LengthM))} of {Wording.Trimmed(show.Diameter(p.InsideDiameterM))}, {show.Velocity(p.VelocityMPerS)}. "));
        text += input.MeterPowerKw > 0 ? $"{input.Machine} gives {UnitDisplay.Power(input.MeterPowerKw)}." : $"{input.Machine} stands.";
        if (at.HasRun && at.HeightRatio > 1)
            text += $" Heights are drawn {UnitDisplay.Number(at.HeightRatio, 2)} times larger than distances.";
        return pipe.IsToScale ? text : text + " The pipe is drawn wider than it is.";
    }
}

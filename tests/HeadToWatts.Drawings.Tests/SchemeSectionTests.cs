using HeadToWatts.Basis.Units;
using HeadToWatts.Drawings.Canvas;
using HeadToWatts.Drawings.Layout;
using HeadToWatts.Drawings.Scheme;

namespace HeadToWatts.Drawings.Tests;

public sealed class SchemeSectionTests
{
    private static readonly UnitDisplay Si = UnitDisplay.For(UnitSystem.SI);

    // One pipe whose grade lines are laid down by hand: 20 m of head, 2 m lost on the way, 0.4 m of velocity head.
    private static SchemeSectionInput ByHand(double lostM = 2, double lengthM = 80, double diameterM = 1) => new(
        1.5, 120, 100, true, 20 - lostM,
        [new SectionPipe("pipe", lengthM, diameterM, 2.8)],
        [new GradePoint(0, 119, 119.4, 119.8), new GradePoint(lengthM, 100.5, 120 - lostM - 0.4, 120 - lostM)],
        "Francis × 1", 230);

    [Fact]
    public void Heads_are_drawn_to_the_scale_of_the_level_axis()
    {
        var drawing = SchemeSection.Draw(ByHand(), Si, DrawingSize.Wide);
        var perMetre = PixelsPerMetre(drawing);
        var (gross, net) = (LongestUpright(drawing, 0), LongestUpright(drawing, 1));
        Assert.Equal(20 * perMetre, gross, 0.01);
        Assert.Equal(18 * perMetre, net, 0.01);
    }

    [Fact]
    public void Energy_line_lies_a_velocity_head_above_the_hydraulic_line_and_falls_by_the_losses()
    {
        var drawing = SchemeSection.Draw(ByHand(), Si, DrawingSize.Wide);
        var perMetre = PixelsPerMetre(drawing);
        var energy = drawing.Operations.OfType<PolylineOperation>().Single(l => l.Stroke.Role == InkRole.Ochre).Points;
        var hydraulic = drawing.Operations.OfType<PolylineOperation>().Single(l => l.Stroke.Role == InkRole.Water).Points;
        Assert.Equal(2 * perMetre, energy[^1].Y - energy[0].Y, 0.01);
        Assert.Equal(0.4 * perMetre, hydraulic[^1].Y - energy[^1].Y, 0.01);
    }

    [Fact]
    public void The_stated_ratio_of_heights_to_distances_is_the_drawn_one()
    {
        var drawing = SchemeSection.Draw(ByHand(lengthM: 400), Si, DrawingSize.Wide);
        var words = drawing.Operations.OfType<TextOperation>().Single(t => t.Content.Contains("larger", StringComparison.Ordinal)).Content;
        var stated = double.Parse(words.Split("drawn ")[1].Split(' ')[0], System.Globalization.CultureInfo.InvariantCulture);
        var ticks = drawing.Operations.OfType<TextOperation>().Where(t => t.Style.Anchor == TextAnchor.Middle && t.Content is "0" or "100").ToDictionary(t => t.Content, t => t.At.X);
        var perMetreAcross = (ticks["100"] - ticks["0"]) / 100;
        Assert.Equal(stated, PixelsPerMetre(drawing) / perMetreAcross, 3);
        Assert.True(stated > 1);
    }

    [Fact]
    public void The_picture_moves_when_a_number_moves_but_its_frame_stands()
    {
        var (little, much) = (SchemeSection.Draw(ByHand(1), Si, DrawingSize.Wide), SchemeSection.Draw(ByHand(6), Si, DrawingSize.Wide));
        Assert.True(LongestUpright(much, 1) < LongestUpright(little, 1));
        Assert.Equal(LongestUpright(little, 0), LongestUpright(much, 0), 6);
        Assert.Equal(PixelsPerMetre(little), PixelsPerMetre(much), 9);
    }

    [Fact]
    public void A_wide_pipe_is_drawn_to_scale_and_a_narrow_one_says_that_it_is_not()
    {
        Assert.DoesNotContain("wider", SchemeSection.Draw(ByHand(diameterM: 1.6), Si, DrawingSize.Wide).Description, StringComparison.Ordinal);
        var narrow = SchemeSection.Draw(ByHand(lengthM: 600, diameterM: 0.2), Si, DrawingSize.Wide);
        Assert.Contains("drawn wider", narrow.Description, StringComparison.Ordinal);
        Assert.Contains(narrow.Operations.OfType<TextOperation>(), t => t.Content.Contains("pipe drawn wider", StringComparison.Ordinal));
    }

    [Fact]
    public void The_three_heads_add_up_as_printed()
    {
        var words = SchemeSection.Draw(ByHand(2.04), Si, DrawingSize.Wide).Description;
        Assert.Contains("gross head 20.0 m, losses 2.0 m, net head 18.0 m", words, StringComparison.Ordinal);
    }

    [Fact]
    public void A_section_of_a_study_ends_at_its_net_head()
    {
        foreach (var name in Scenarios.Names)
        {
            var result = Scenarios.Get(name);
            var input = SchemeSection.InputOf(result);
            Assert.Equal(result.Energy.Plant.At(result.Flow.DesignFlowM3PerS).NetHeadM, input.NetHeadM, 12);

            // Energy is accounted for: gross head is net head and every loss, before the machine and behind it.
            var losses = result.Waterway.Waterway.LossM(input.FlowM3PerS, result.Site);
            Assert.Equal(input.GrossHeadM, input.NetHeadM + losses, 9);
            Assert.Equal(input.EnergyAtMachineM - input.LossBehindMachineM - input.TailwaterM, input.NetHeadM, 9);
        }
    }

    [Fact]
    public void The_section_stays_readable_while_the_flow_runs_from_nothing_to_more_than_full()
    {
        foreach (var name in Scenarios.Names)
        {
            var result = Scenarios.Get(name);
            foreach (var size in AllDrawings.Sizes.Values)
            {
                for (var step = 0; step <= 16; step++)
                {
                    var drawing = SchemeSection.Draw(result, result.Show(), size, result.Flow.DesignFlowM3PerS * step / 12);
                    var boxes = drawing.Operations.OfType<TextOperation>().Select(t => LabelBox.Of(t.At, t.Content, t.Style)).ToList();
                    for (var i = 0; i < boxes.Count; i++)
                    {
                        Assert.True(boxes[i].LiesWithin(0, 0, drawing.Width, drawing.Height));
                        for (var k = i + 1; k < boxes.Count; k++)
                            Assert.False(boxes[i].Touches(boxes[k], 0), $"{name} at step {step}");
                    }
                }
            }
        }
    }

    [Fact]
    public void Where_the_tailwater_rises_with_the_flow_the_water_moves_and_the_pipe_and_scale_stay()
    {
        var result = Scenarios.Get("rising tailwater");
        var (low, high) = (SchemeSection.InputOf(result, 6), SchemeSection.InputOf(result, 29.5));

        // 29.5 m3/s for the plant and 0.5 reserved pass: the rating says 22.4 m there, and 20 + 6.5/12 x 0.5 at 6.5.
        Assert.Equal(22.4, high.TailwaterM, 9);
        Assert.Equal(20 + (6.5 / 12 * 0.5), low.TailwaterM, 9);
        Assert.Equal(low.Grades.Select(g => g.CentreLevelM), high.Grades.Select(g => g.CentreLevelM));
        var (lowDrawn, highDrawn) = (SchemeSection.Draw(low, Si, DrawingSize.Wide), SchemeSection.Draw(high, Si, DrawingSize.Wide));
        Assert.Equal(PixelsPerMetre(lowDrawn), PixelsPerMetre(highDrawn), 9);
        Assert.Equal(PixelsPerMetre(lowDrawn), PixelsPerMetre(SchemeSection.Draw(result, Si, DrawingSize.Wide, 0)), 9);
        Assert.Equal(low.GrossHeadM / high.GrossHeadM, LongestUpright(lowDrawn, 0) / LongestUpright(highDrawn, 0), 6);
    }

    [Fact]
    public void Gross_and_net_head_are_always_dimensioned()
    {
        foreach (var name in Scenarios.Names)
        {
            foreach (var size in AllDrawings.Sizes.Values)
            {
                var result = Scenarios.Get(name);
                var texts = SchemeSection.Draw(result, result.Show(), size).Operations.OfType<TextOperation>().Select(t => t.Content).ToList();
                Assert.Contains("gross head " + result.Show().Length(result.Head.GrossHeadM), texts);
                Assert.Contains(texts, t => t.StartsWith("net head ", StringComparison.Ordinal));
            }
        }
    }

    [Theory]
    [InlineData(0)]
    [InlineData(-3)]
    public void A_section_without_a_fall_is_refused(double headM)
    {
        var input = ByHand() with { HeadwaterM = 100 + headM };
        Assert.Throws<ArgumentException>(() => SchemeSection.Draw(input, Si, DrawingSize.Wide));
    }

    private static double PixelsPerMetre(Drawing drawing)
    {
        var levels = drawing.Operations.OfType<TextOperation>().Where(t => t.Style.Anchor == TextAnchor.End && t.Content.All(c => char.IsDigit(c) || c == '.'))
            .Select(t => (Level: double.Parse(t.Content, System.Globalization.CultureInfo.InvariantCulture), t.At.Y)).OrderBy(t => t.Level).ToList();
        return (levels[0].Y - levels[^1].Y) / (levels[^1].Level - levels[0].Level);
    }

    private static double LongestUpright(Drawing drawing, int rank) => drawing.Operations.OfType<LineOperation>()
        .Where(l => l.Stroke is { Role: InkRole.Ink, Dash: Dash.Solid } && l.From.X == l.To.X).Select(l => Math.Abs(l.To.Y - l.From.Y)).OrderDescending().ElementAt(rank);
}

using System.Globalization;
using System.Text.RegularExpressions;
using HeadToWatts.Basis.Units;
using HeadToWatts.Memos.Content;
using HeadToWatts.Memos.Tests.Pdf;
using HeadToWatts.Studies.Cautions;
using HeadToWatts.Studies.Workings;
using UglyToad.PdfPig.Tokens;

namespace HeadToWatts.Memos.Tests.Sections;

public partial class MemoOfStudyTests
{
    private static readonly string[] SectionTitles =
    [
        "The answer", "Site and scheme", "Flow data and their quality", "Water that may be used", "Head and losses", "Turbine options", "Design flow", "Energy", "Whether it pays",
        "Cautions", "Hazards and permits", "Assumptions and limits", "Inputs as given", "Workings", "Constants of the site", "Methods and their ranges", "Sources",
    ];

    private static readonly string[] SectionsOfRecords = ["The flow by season and year", "Energy year by year"];

    public static TheoryData<string, string> SitesAndUnits()
    {
        var data = new TheoryData<string, string>();
        foreach (var site in Studies.Sites)
        {
            data.Add(site, "US");
            data.Add(site, "SI");
        }

        return data;
    }

    [Theory]
    [MemberData(nameof(SitesAndUnits))]
    public void The_answer_carries_the_numbers_of_the_study(string site, string units)
    {
        var result = Studies.Of(site);
        var show = Studies.Show(result, units);
        using var read = new ReadBack(Memo.Make(result, show));
        var annual = result.Energy.Annual;
        foreach (var number in new[]
        {
            UnitDisplay.Power(annual.MeterPowerKw), UnitDisplay.Power(annual.InstalledPowerKw), UnitDisplay.Energy(annual.AnnualEnergyKwh), UnitDisplay.Percent(annual.PlantFactor),
            show.Flow(result.Flow.DesignFlowM3PerS), show.Length(result.Head.NetHeadAtDesignM), show.Length(result.Head.GrossHeadM),
        })
        {
            Assert.Contains(Printed(number), read.PageTexts[0], StringComparison.Ordinal);
        }

        Assert.Contains(result.Header.Name, read.PageTexts[0], StringComparison.Ordinal);
        Assert.Contains(result.Turbine.Chosen.Type.Name, read.PageTexts[0], StringComparison.OrdinalIgnoreCase);
        Assert.Contains(StandingCautions.Status, read.PageTexts[0], StringComparison.Ordinal);
        Assert.Contains(Squeezed(StandingCautions.Statement), Squeezed(read.PageTexts[0]), StringComparison.Ordinal);
        if (result.Energy.Days?.DryYearKwh is { } dry)
            Assert.Contains(Printed(UnitDisplay.Energy(dry)) + " in a dry year", read.PageTexts[0], StringComparison.Ordinal);
    }

    [Theory]
    [MemberData(nameof(SitesAndUnits))]
    public void Every_section_is_there_in_order_and_in_the_outline(string site, string units)
    {
        var result = Studies.Of(site);
        using var read = new ReadBack(Memo.Make(result, Studies.Show(result, units)));
        Assert.True(read.Pdf.TryGetBookmarks(out var bookmarks));
        var titles = bookmarks.Roots.Select(r => r.Title[(r.Title.IndexOf(' ', StringComparison.Ordinal) + 1)..]).ToList();
        Assert.Equal(SectionTitles, titles.Except(SectionsOfRecords).Except(["The canal and its drop"]));
        Assert.Equal(result.Input.Head.Canal is not null, titles.Contains("The canal and its drop"));
        Assert.Equal(result.Input.Flow.Record is null ? [] : SectionsOfRecords, titles.Intersect(SectionsOfRecords));
        Assert.Equal(units == "US" ? 792 : 841.89, read.Pages[0].Height, 0.01);
        for (var i = 0; i < read.Pages.Count; i++)
            Assert.Contains($"Page {i + 1} of {read.Pages.Count}", read.PageTexts[i], StringComparison.Ordinal);
    }

    [Theory]
    [MemberData(nameof(SitesAndUnits))]
    public void Sources_are_numbered_in_order_of_first_use_and_every_number_leads_to_one(string site, string units)
    {
        var result = Studies.Of(site);
        var memo = Memo.Document(result, Studies.Show(result, units));
        var sources = memo.Blocks.OfType<ListBlock>().Last();
        var cited = MemoTexts.Of(memo with { Blocks = [.. memo.Blocks.TakeWhile(b => b != sources)] })
            .SelectMany(t => Citation().Matches(t).Select(m => int.Parse(m.Groups[1].ValueSpan, CultureInfo.InvariantCulture))).ToArray();
        Assert.Equal(Enumerable.Range(1, sources.Items.Count), cited.Distinct());
        Assert.Equal(Enumerable.Range(1, sources.Items.Count).Select(i => $"[{i}]"), sources.Labels);
        foreach (var use in result.MethodsUsed)
            Assert.Contains(sources.Items, i => i.Plain.Contains(use.Method.Source.Title.TrimEnd('.'), StringComparison.Ordinal));
        using var read = new ReadBack(Memo.Make(result, Studies.Show(result, units)));
        Assert.Contains($"[{sources.Items.Count}]", read.PageTexts[^1], StringComparison.Ordinal);
    }

    [Theory]
    [MemberData(nameof(SitesAndUnits))]
    public void Every_caution_and_every_working_is_printed_in_the_words_of_the_study(string site, string units)
    {
        var result = Studies.Of(site);
        var show = Studies.Show(result, units);
        using var read = new ReadBack(Memo.Make(result, show));
        foreach (var caution in CautionRules.For(result, show))
        {
            Assert.Contains(Squeezed(caution.Title), Squeezed(read.Text), StringComparison.Ordinal);
            Assert.Contains(Squeezed(Printed(caution.Text)[..Math.Min(30, Printed(caution.Text).Length)]), Squeezed(read.Text), StringComparison.Ordinal);
        }

        var texts = MemoTexts.Of(Memo.Document(result, show)).ToHashSet();
        foreach (var working in WorkingsList.For(result, show))
        {
            Assert.Contains(working.Title, texts);
            Assert.Contains(texts, t => t.EndsWith(working.Result, StringComparison.Ordinal));
        }
    }

    [Theory]
    [MemberData(nameof(SitesAndUnits))]
    public void The_printed_water_balance_and_loss_staircase_add_up(string site, string units)
    {
        var result = Studies.Of(site);
        var memo = Memo.Document(result, Studies.Show(result, units));
        var water = memo.Blocks.OfType<TableBlock>().Single(t => t.Anchor == "tab-water");
        Assert.Equal(Number(water.Rows[^1].Cells[1]), water.Rows.SkipLast(1).Sum(r => Number(r.Cells[1])), 6);
        Assert.Equal(100.0, water.Rows.SkipLast(1).Sum(r => Number(r.Cells[2])), 6);
        var stairs = memo.Blocks.OfType<TableBlock>().Single(t => t.Anchor == "tab-staircase");
        var left = Number(stairs.Rows[0].Cells[2]);
        foreach (var row in stairs.Rows.Skip(1).SkipLast(1))
        {
            left -= Number(row.Cells[1]);
            Assert.Equal(left, Number(row.Cells[2]), 6);
        }

        Assert.Equal(left, Number(stairs.Rows[^1].Cells[2]), 6);
        Assert.Equal(result.Energy.Annual.AnnualEnergyKwh / 1000, left, result.Energy.Annual.AnnualEnergyKwh / 1000 * 2e-3);
    }

    [Theory]
    [MemberData(nameof(SitesAndUnits))]
    public void The_memo_claims_nothing_it_must_not_and_says_what_it_is(string site, string units)
    {
        var result = Studies.Of(site);
        var text = string.Join('\n', MemoTexts.Of(Memo.Document(result, Studies.Show(result, units))));
        foreach (var claim in new[] { "guaranteed", "guarantees", "permit-free", "no permit", "structurally sound", "legally", "certified", "replaces a feasibility" })
            Assert.DoesNotContain(claim, text, StringComparison.OrdinalIgnoreCase);
        Assert.Contains(StandingCautions.Statement, text, StringComparison.Ordinal);
        Assert.Contains("check current law", text, StringComparison.Ordinal);
        Assert.Contains("Local codes", text, StringComparison.Ordinal);
        Assert.All(StandingCautions.Hazards.Concat(StandingCautions.Permits), h =>
        {
            Assert.Contains(h.Text, text, StringComparison.Ordinal);
            Assert.Contains(h.Authority, text, StringComparison.Ordinal);
        });
    }

    [Theory]
    [MemberData(nameof(SitesAndUnits))]
    public void The_same_study_is_the_same_file_with_nothing_outside_the_margins_and_no_letter_missing(string site, string units)
    {
        var result = Studies.Of(site);
        var show = Studies.Show(result, units);
        var pdf = Memo.Make(result, show);
        Assert.Equal(pdf, Memo.Make(result, show));
        Assert.Empty(HeadToWatts.Memos.Pdf.MemoPdf.MissingCharacters(Memo.Document(result, show)));
        using var read = new ReadBack(pdf);
        foreach (var page in read.Pages)
        {
            Assert.All(page.Letters.Where(l => !string.IsNullOrWhiteSpace(l.Value)), l =>
            {
                Assert.InRange(l.BoundingBox.Left, 58, page.Width - 58);
                Assert.InRange(l.BoundingBox.Right, 58, page.Width - 58);
                Assert.InRange(l.BoundingBox.Bottom, 30, page.Height - 30);
                Assert.InRange(l.BoundingBox.Top, 30, page.Height - 30);
            });
        }

        var figures = read.Elements().Where(e => e.Type == "Figure").ToArray();
        Assert.True(figures.Length >= 5);
        Assert.All(figures, f => Assert.True((f.Element.Data["Alt"] is HexToken hex ? hex.Data : ((StringToken)f.Element.Data["Alt"]).Data).Length > 40));
    }

    [Theory]
    [MemberData(nameof(SitesAndUnits))]
    public void No_word_of_a_table_is_broken_inside(string site, string units)
    {
        var result = Studies.Of(site);
        var layout = HeadToWatts.Memos.Layout.MemoLayout.Of(Memo.Document(result, Studies.Show(result, units)));
        var printed = layout.Pages.SelectMany(p => p.Ops).OfType<HeadToWatts.Memos.Layout.TextOp>().SelectMany(t => t.Text.Split(' ')).ToHashSet();
        Assert.Contains("Units", printed);
        Assert.Contains("outside", printed);
        Assert.Contains("Reserved,", printed);
    }

    [Fact]
    public void A_site_without_usable_water_gets_a_memo_that_says_so()
    {
        var result = Studies.Changed("sorrel-creek", d => d.Alternatives[0].Flow.PriorDeliveries = "100000 cfs");
        using var read = new ReadBack(Memo.Make(result, result.Show()));
        Assert.Contains("this site would make no energy", read.PageTexts[0], StringComparison.Ordinal);
        Assert.Contains("Hazards", read.Text, StringComparison.Ordinal);
    }

    [Fact]
    public void Levels_that_move_are_shown_with_the_flow_and_are_not_called_constant()
    {
        var result = Studies.Changed("larkspur-drop", d =>
        {
            d.Alternatives[0].Head.Tailwater = null;
            d.Alternatives[0].Head.TailwaterRating =
            [
                new() { Flow = "20 cfs", Level = "4289.0 ft" },
                new() { Flow = "250 cfs", Level = "4291.5 ft" },
            ];
        });
        var memo = Memo.Document(result, result.Show());
        var levels = memo.Blocks.OfType<TableBlock>().Single(t => t.Anchor == "tab-levels");
        Assert.Equal(result.Head.Levels.Count, levels.Rows.Count);
        Assert.All(levels.Rows, r => Assert.Equal(Number(r.Cells[1]) - Number(r.Cells[2]), Number(r.Cells[3]), 0.11));
        var text = string.Join('\n', MemoTexts.Of(memo));
        Assert.DoesNotContain("held constant", text, StringComparison.Ordinal);
        Assert.DoesNotContain("hold at every flow", text, StringComparison.Ordinal);
        Assert.Contains("4289.0 ft at 20.0 cfs", text, StringComparison.Ordinal);
        Assert.NotEmpty(Memo.Make(result, result.Show()));
    }

    [Fact]
    public void A_measured_head_is_printed_with_its_error_and_what_that_does_to_the_energy()
    {
        var result = Studies.Changed("sorrel-creek", d => d.Alternatives[0].Head = new() { Measured = new() { Gauge = "82 psi", GaugeHeight = "3 ft", Error = "1 psi" } });
        var show = result.Show();
        var range = result.Energy.WithHeadError!;
        using var read = new ReadBack(Memo.Make(result, show));
        Assert.Contains("82 psi with the pipe full and at rest", read.Text, StringComparison.Ordinal);
        Assert.Contains(Printed($"{UnitDisplay.Energy(range.LowKwh)} to {UnitDisplay.Energy(range.HighKwh)}"), read.PageTexts[0], StringComparison.Ordinal);
        Assert.Contains(Squeezed(Printed(show.Length(result.Input.Head.ErrorM) + " either way")), Squeezed(read.Text), StringComparison.Ordinal);
    }

    [Fact]
    public void What_was_assumed_is_printed_with_the_inputs()
    {
        var result = Studies.Changed("larkspur-drop", d => d.Alternatives[0].Site.WaterTemperature = null);
        Assert.NotEmpty(result.Input.Assumptions);
        var text = string.Join('\n', MemoTexts.Of(Memo.Document(result, result.Show())));
        Assert.Contains("Assumed where nothing was given", text, StringComparison.Ordinal);
        Assert.All(result.Input.Assumptions, a => Assert.Contains(a.TrimEnd('.')[1..], text, StringComparison.Ordinal));
    }

    [Fact]
    public void The_gross_head_in_the_workings_is_the_difference_of_the_levels_printed()
    {
        var result = Studies.Of("larkspur-drop");
        var working = WorkingsList.Find(result, result.Show(), "gross-head")!;
        var levels = working.Numbers.Split(" − ").Select(t => double.Parse(t.Split(' ')[0].Replace("\u202f", "", StringComparison.Ordinal), CultureInfo.InvariantCulture)).ToArray();
        Assert.Equal(result.Show().LengthUnit.FromHeld(result.Head.GrossHeadM), levels[0] - levels[1], 0.051);
    }

    [Fact]
    public void A_machine_at_the_drop_without_a_pipe_gets_a_memo()
    {
        var result = Studies.Changed("larkspur-drop", d => d.Alternatives[0].Waterway.Elements.Clear());
        using var read = new ReadBack(Memo.Make(result, result.Show()));
        Assert.Contains("without a pipe before it", read.Text, StringComparison.Ordinal);
        Assert.DoesNotContain("Pressures with a sudden stop", read.Text, StringComparison.Ordinal);
    }

    [Fact]
    public void Words_of_the_author_are_printed_as_written_and_letters_without_a_glyph_are_named()
    {
        var result = Studies.Changed("larkspur-drop", d =>
        {
            d.Name = "Åse & <Sons> {_net} ^2";
            d.Client = "水利 Co.";
        });
        using var read = new ReadBack(Memo.Make(result, result.Show()));
        Assert.Contains("Åse & <Sons> {_net} ^2", read.PageTexts[0], StringComparison.Ordinal);
        Assert.Contains("?? Co.", read.PageTexts[0], StringComparison.Ordinal);
        Assert.Contains("U+5229, U+6C34", read.Text, StringComparison.Ordinal);
    }

    [GeneratedRegex(@"\[(\d+)\]")]
    private static partial Regex Citation();

    private static double Number(RichText cell) => cell.Plain.Length == 0 ? 0 : double.Parse(cell.Plain.Replace("\u202f", "", StringComparison.Ordinal).Replace('−', '-'), CultureInfo.InvariantCulture);

    // As it stands in print, read back with plain spaces.
    private static string Printed(string text) => ReadBack.Plain(HeadToWatts.Memos.Layout.Type.Letters.FitPlain(text));

    private static string Squeezed(string text) => text.Replace(" ", "", StringComparison.Ordinal);
}

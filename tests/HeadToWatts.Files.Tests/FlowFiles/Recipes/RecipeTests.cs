using System.Text;
using HeadToWatts.Basis.Units;
using HeadToWatts.Files.FlowFiles;
using HeadToWatts.Files.FlowFiles.Recipes;
using HeadToWatts.Files.StudyFiles;
using HeadToWatts.Files.Tests.StudyFiles;
using HeadToWatts.FlowRecords.SubDaily;

namespace HeadToWatts.Files.Tests.FlowFiles.Recipes;

public sealed class RecipeTests
{
    private static FlowFileSource Source(string text) => FlowFileSource.Hold("r.txt", new MemoryStream(Encoding.UTF8.GetBytes(text))).Value;

    private static FlowFile Read(string text, ReadingRecipe recipe) => FlowFileReader.ReadText("r.txt", text, new FlowFileOptions(Recipe: recipe)).Value;

    [Fact]
    public void The_day_comes_first_when_13_04_occurs_and_the_evidence_says_so()
    {
        const string Text = "Canal Norte\n\nFecha;Caudal;Nota\n;m3/s;\n12/04/2020;1,5;A\n13/04/2020;2,25;A\n14/04/2020;-999;e\n";
        var proposal = RecipeProposer.Propose(Source(Text));
        Assert.Empty(proposal.Questions);
        Assert.Contains(proposal.Evidence, e => e.Field == "dateOrder" && e.Text.Contains("'13/04/2020' occurs in row 6, so the day comes first", StringComparison.Ordinal));
        Assert.Contains(proposal.Evidence, e => e.Field == "decimalSign" && e.Text.Contains("1,5", StringComparison.Ordinal));
        Assert.Contains(proposal.Evidence, e => e.Field == "missing" && e.Text.Contains("-999", StringComparison.Ordinal));
        var recipe = proposal.Recipe;
        Assert.Equal((';', 2, 1, 1, RecipeDateOrder.DayMonthYear, ',', "2", "3"),
            (recipe.Separator, recipe.SkipRows, recipe.HeaderRows, recipe.UnitsRows, recipe.DateOrder, recipe.DecimalSign, recipe.ValueColumn, recipe.QualityColumn));
        var file = Read(Text, recipe);
        Assert.Equal([1.5, 2.25], file.Record!.Flows.ToArray());
        Assert.Equal(new DateOnly(2020, 4, 12), file.Record.FirstDay);
    }

    [Fact]
    public void What_the_file_does_not_decide_is_asked()
    {
        var proposal = RecipeProposer.Propose(Source("when,a,b\n1/2/2020,1,\"1,234\"\n2/2/2020,2,\"2,345\"\n3/2/2020,3,\"3,456\"\n"));
        Assert.Null(proposal.Recipe.DateOrder);
        Assert.Contains(proposal.Questions, q => q.Field == "dateOrder" && q.Text.Contains("With the day first 2 of 2 steps are a day", StringComparison.Ordinal));
        Assert.Contains(proposal.Questions, q => q.Field == "valueColumn" && q.Choices.SequenceEqual(["2: a", "3: b"]));
        Assert.Contains(proposal.Questions, q => q.Field == "unit" && q.Choices.Contains("cfs"));
        Assert.Contains(proposal.Questions, q => q.Field == "decimalSign");
        var read = FlowFileReader.ReadText("r", "when,a\n1/2/2020,1\n2/2/2020,2\n", new FlowFileOptions(Recipe: new ReadingRecipe { HeaderRows = 1, Unit = UnitTable.LitrePerSecond }));
        Assert.Contains("whether the day or the month", Assert.Single(read.Problems).Why, StringComparison.Ordinal);
    }

    [Theory]
    [InlineData("2020-04-13", RecipeDateOrder.YearMonthDay)]
    [InlineData("20200413", RecipeDateOrder.YearMonthDay)]
    [InlineData("200413", RecipeDateOrder.YearMonthDay)]
    [InlineData("4/13/20", RecipeDateOrder.MonthDayYear)]
    [InlineData("04132020", RecipeDateOrder.MonthDayYear)]
    [InlineData("13.4.2020", RecipeDateOrder.DayMonthYear)]
    [InlineData("13-Apr-2020", RecipeDateOrder.DayMonthYear)]
    [InlineData("13 April 20", RecipeDateOrder.DayMonthYear)]
    [InlineData("43934", RecipeDateOrder.SpreadsheetDay)]
    [InlineData("43934.0", RecipeDateOrder.SpreadsheetDay)]
    public void Dates_are_read_in_the_order_that_is_told(string date, RecipeDateOrder order)
    {
        var file = Read($"{date};5\n", new ReadingRecipe { Separator = ';', DateOrder = order, TwoDigitYearsFrom = 1950, Unit = UnitTable.CubicMetrePerSecond });
        Assert.Equal((new DateOnly(2020, 4, 13), 5.0), (file.Record!.FirstDay, file.Record.Flows[0]));
    }

    // From memory: Excel's day 43934 is 13 April 2020, checked against DateTime.FromOADate.
    [Fact]
    public void Spreadsheet_days_are_those_of_the_base_class_library()
    {
        for (var day = 61; day < 60_000; day += 997)
        {
            var file = Read($"{day};5\n", new ReadingRecipe { Separator = ';', DateOrder = RecipeDateOrder.SpreadsheetDay, Unit = UnitTable.CubicMetrePerSecond });
            Assert.Equal(DateOnly.FromDateTime(DateTime.FromOADate(day)), file.Record!.FirstDay);
        }
    }

    [Fact]
    public void Fixed_widths_three_columns_of_date_thousands_and_limits_are_read()
    {
        const string Text = "YEARMODAFLOW      \n2020 413 1 234.5  A\n2020 414    -1.0  e\n2020 415     ***  A\n";
        var recipe = new ReadingRecipe { Widths = [4, 2, 2, 10, 3], HeaderRows = 1, DateColumns = ["1", "2", "3"], ValueColumn = "4", QualityColumn = "5", ThousandsSign = ' ', MissingMarks = ["<= -0.5", "***"], Unit = UnitTable.CubicFootPerSecond };
        var file = Read(Text, recipe);
        Assert.Equal(1234.5, UnitTable.CubicFootPerSecond.FromHeld(file.Record!.Flows[0]), 1e-9);
        Assert.Equal((3, 1, 2), (file.Report.Rows, file.Report.Valid, file.Report.RowsOutsidePeriod));
    }

    [Fact]
    public void A_preview_shows_the_cells_beside_what_is_read_of_them()
    {
        var preview = RecipePreview.Of(Source("# made by hand\nday,flow\n2020-04-13,5\n2020-04-14,x\n2020-04-15,NA\n"), new ReadingRecipe { HeaderRows = 1, Unit = UnitTable.LitrePerSecond });
        Assert.Equal(["day", "flow"], preview.Columns);
        Assert.Equal([RecipeRowRole.Skipped, RecipeRowRole.Header, RecipeRowRole.Data, RecipeRowRole.Data, RecipeRowRole.Data], preview.Rows.Select(r => r.Role));
        Assert.Equal(("2020-04-13", "5", ""), (preview.Rows[2].Stamp, preview.Rows[2].Value, preview.Rows[2].Problem));
        Assert.Contains("neither a number", preview.Rows[3].Problem, StringComparison.Ordinal);
        Assert.Equal("missing", preview.Rows[4].Value);
    }

    [Fact]
    public void A_recipe_reads_back_from_its_text_and_from_a_study()
    {
        var recipe = new ReadingRecipe
        {
            Separator = '\t', SkipRows = 3, HeaderRows = 1, UnitsRows = 1, DateColumns = ["Date"], DateOrder = RecipeDateOrder.DayMonthYear, TwoDigitYearsFrom = 1970, TimeColumn = "2", DecimalSign = ',', ThousandsSign = '.',
            MissingMarks = ["-999", "<= -1", "n.a."], Unit = UnitTable.LitrePerSecond, ValueColumn = "3", QualityColumn = "Q", Clock = new RecipeClock(TimeZoneInfo.FindSystemTimeZoneById("America/Denver")), OnlyColumn = "9", OnlyText = "PE16.4",
        };
        var document = RecipeFile.Parse("r.json", RecipeFile.Write(RecipeDocument.From(recipe))).Value;
        Same(recipe, RecipeBuilder.Build(document, "").Value);

        var study = StudyFileReader.Parse("s.json", Samples.Good).Value;
        study.Alternatives[0].Flow.Curve = null;
        study.Alternatives[0].Flow.Record = new RecordDocument { File = "flow.txt", Recipe = document, Policies = new PolicyDocument { Gaps = "interpolated up to 5 days", DayShare = "80 %" } };
        var again = StudyFileReader.Parse("s.json", StudyFileWriter.Write(study)).Value.Alternatives[0].Flow.Record!;
        Same(recipe, RecipeBuilder.Build(again.Recipe!, "").Value);
        Assert.True(FolderFlowFiles.TryOptions(again, "record.file", [], out var options));
        Assert.Equal((5, 0.8), (options.Policies!.LongestGapDays, options.SubDaily!.DayShareNeeded));

        static void Same(ReadingRecipe a, ReadingRecipe b) =>
            Assert.Equal(RecipeFile.Write(RecipeDocument.From(a)), RecipeFile.Write(RecipeDocument.From(b)));
    }

    [Fact]
    public void Wrong_choices_are_told_by_field_with_what_is_accepted()
    {
        var problems = RecipeBuilder.Build(new RecipeDocument { Separator = "slash", DateOrder = "backwards", DateColumn = "1; 2", DecimalSign = "-", ThousandsSign = "#", Unit = "psi", SkipRows = "many", TimeZone = "Nowhere/Land", Missing = ["<", "-999"], OnlyColumn = "1" }, "record.recipe").Problems;
        Assert.Equal(["dateColumn", "dateOrder", "decimalSign", "missing", "onlyColumn", "separator", "skipRows", "thousandsSign", "timeZone", "unit"],
            problems.Select(p => p.Where["record.recipe.".Length..]).Order(StringComparer.Ordinal));
        Assert.All(problems.Where(p => p.Where != "record.recipe.missing"), p => Assert.NotEmpty(p.Accepted));
        Assert.Contains("perhaps 'separator'", Assert.Single(RecipeFile.Parse("r.json", "{ \"seperator\": \"comma\" }").Problems).Why, StringComparison.Ordinal);
        Assert.Contains("not JSON", Assert.Single(RecipeFile.Parse("r.json", "{").Problems).Why, StringComparison.Ordinal);
    }

    [Fact]
    public void A_recipe_that_does_not_fit_refuses_with_row_and_reason()
    {
        var read = FlowFileReader.ReadText("r.txt", "a,b\n2020-01-01,5\n2020-13-01,6\n2020-01-03\n2020-01-04,1.234\n", new FlowFileOptions(Recipe: new ReadingRecipe { HeaderRows = 1, DateOrder = RecipeDateOrder.YearMonthDay, DecimalSign = ',', Unit = UnitTable.LitrePerSecond }));
        Assert.Equal(["r.txt row 3", "r.txt row 4", "r.txt row 5"], read.Problems.Select(p => p.Where));
        Assert.Contains("no column of this name", Assert.Single(FlowFileReader.ReadText("r.txt", "a,b\n2020-01-01,5\n", new FlowFileOptions(Recipe: new ReadingRecipe { HeaderRows = 1, ValueColumn = "c" })).Problems).Why, StringComparison.Ordinal);
    }

    // Loggers of the US Bureau of Reclamation: fixed columns, years of two digits, several stations in one file.
    [SkippableFact]
    public void A_logger_file_of_several_stations_is_read_one_by_one()
    {
        var text = File.ReadAllText(ReferenceFlows.PathOf("quirk_StevensLogger.txt"));
        var proposal = RecipeProposer.Propose(Source(text));
        Assert.Equal((' ', "4", "5", RecipeDateOrder.YearMonthDay), (proposal.Recipe.Separator, proposal.Recipe.DateColumns[0], proposal.Recipe.TimeColumn, proposal.Recipe.DateOrder));
        var recipe = proposal.Recipe with { ValueColumn = "6", Unit = UnitTable.CubicFootPerSecond, OnlyColumn = "1", OnlyText = "WB5WW1" };
        var file = FlowFileReader.ReadText("s.txt", text, new FlowFileOptions(Recipe: recipe, SubDaily: new SubDailySettings(0.01))).Value;
        Assert.Equal((new DateOnly(2007, 8, 27), 4, 1), (file.Record!.FirstDay, file.Report.Rows, file.Report.Valid));
        Assert.Equal(1.51, UnitTable.CubicFootPerSecond.FromHeld(file.Record.Flows[0]), 1e-9);
    }

    [SkippableFact]
    public void A_file_of_two_digit_years_is_proposed_and_read()
    {
        var text = File.ReadAllText(ReferenceFlows.PathOf("quirk_mmddyy.csv"));
        var proposal = RecipeProposer.Propose(Source(text));
        Assert.Contains(proposal.Evidence, e => e.Field == "dateOrder" && e.Text.Contains("07/31/06", StringComparison.Ordinal) && e.Text.Contains("the month comes first", StringComparison.Ordinal));
        Assert.Equal("unit", Assert.Single(proposal.Questions).Field);
        var read = FlowFileReader.ReadText("m.csv", text, new FlowFileOptions(Recipe: proposal.Recipe with { Unit = UnitTable.LitrePerSecond }, SubDaily: new SubDailySettings(0.01)));
        Assert.Equal(new DateOnly(2006, 7, 31), read.Value.Record!.FirstDay);
    }

    [SkippableFact]
    public void Every_reference_file_gets_a_proposal_or_questions()
    {
        foreach (var path in Directory.EnumerateFiles(Path.GetDirectoryName(ReferenceFlows.PathOf("oracle.csv"))!))
        {
            using var stream = File.OpenRead(path);
            var proposal = RecipeProposer.Propose(FlowFileSource.Hold(Path.GetFileName(path), stream).Value);
            Assert.True(proposal.Evidence.Count + proposal.Questions.Count > 0, path);
            Assert.True(RecipeBuilder.Build(RecipeDocument.From(proposal.Recipe), "").IsGood, path);
        }
    }
}

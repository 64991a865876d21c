using System.Text;
using System.Text.Json;
using HeadToWatts.Cli;
using UglyToad.PdfPig;

namespace HeadToWatts.Cli.Tests;

public sealed class CommandLineTests : IDisposable
{
    private readonly string _folder = Directory.CreateTempSubdirectory("headtowatts-").FullName;

    public void Dispose() => Directory.Delete(_folder, recursive: true);

    [Fact]
    public void Assess_prints_the_answer_and_writes_memo_results_and_tables()
    {
        var (code, output, error) = Run("assess", Site("larkspur-drop"), "--json", In("r.json"), "--memo", In("m.pdf"), "--tables", In("tables"));
        Assert.Equal("", error);
        Assert.Equal(CommandLine.Done, code);
        Assert.Contains("Kaplan", output, StringComparison.Ordinal);
        Assert.Contains("Screening, not for construction", output, StringComparison.Ordinal);
        using var json = JsonDocument.Parse(File.ReadAllText(In("r.json")));
        Assert.Equal(5.6388, json.RootElement.GetProperty("alternatives")[0].GetProperty("grossHeadM").GetDouble(), 9);
        using var pdf = PdfDocument.Open(In("m.pdf"));
        Assert.Contains("Larkspur", pdf.GetPage(1).Text, StringComparison.Ordinal);
        Assert.True(File.Exists(In("tables/duration-curve.csv")));
        Assert.Empty(Directory.GetFiles(_folder, "*.part*"));
    }

    [Fact]
    public void Assess_writes_results_to_standard_output_alone_for_a_pipe()
    {
        var (code, output, _) = Run("assess", Site("sorrel-creek"), "--json", "-");
        Assert.Equal(CommandLine.Done, code);
        using var json = JsonDocument.Parse(output);
        Assert.Equal("Sorrel Creek farm", json.RootElement.GetProperty("study").GetString());
    }

    [Fact]
    public void A_study_comes_from_standard_input_with_a_dash()
    {
        var (code, output, _) = RunWith(File.ReadAllText(Site("tamarack-pipeline")), "assess", "-");
        Assert.Equal(CommandLine.Done, code);
        Assert.Contains("Tamarack", output, StringComparison.Ordinal);
    }

    [Fact]
    public void Check_tells_every_problem_one_a_line_with_file_field_what_and_why()
    {
        var text = File.ReadAllText(Site("sorrel-creek")).Replace("\"196 ft\"", "\"196\"", StringComparison.Ordinal).Replace("\"1840 ft\"", "\"1840 psi\"", StringComparison.Ordinal);
        File.WriteAllText(In("bad.json"), text);
        var (code, output, error) = Run("check", In("bad.json"));
        Assert.Equal(CommandLine.Refused, code);
        Assert.Equal("", output);
        var lines = error.Split('\n', StringSplitOptions.RemoveEmptyEntries);
        Assert.Equal(2, lines.Length);
        Assert.Contains(lines, l => l.StartsWith(In("bad.json") + ": alternatives[0].head.gross: 196: the unit is missing", StringComparison.Ordinal));
        Assert.Contains(lines, l => l.Contains("alternatives[0].waterway.elements[0].length: 1840 psi: 'psi' measures a pressure", StringComparison.Ordinal));
    }

    [Fact]
    public void A_refused_study_writes_no_file()
    {
        File.WriteAllText(In("bad.json"), "{");
        var (code, _, _) = Run("assess", In("bad.json"), "--memo", In("m.pdf"), "--json", In("r.json"));
        Assert.Equal(CommandLine.Refused, code);
        Assert.False(File.Exists(In("m.pdf")) || File.Exists(In("r.json")));
    }

    [Fact]
    public void A_place_that_cannot_be_written_is_told_and_leaves_nothing_half_done()
    {
        var (code, _, error) = Run("assess", Site("sorrel-creek"), "--memo", In("no/such/folder/m.pdf"));
        Assert.Equal(CommandLine.Refused, code);
        Assert.Contains("cannot be written", error, StringComparison.Ordinal);
    }

    [Theory]
    [InlineData("assess")]
    [InlineData("assess", "a", "b")]
    [InlineData("asess", "x.json")]
    [InlineData("check", "x.json", "--speed")]
    public void Wrong_usage_exits_with_two(params string[] args) => Assert.Equal(CommandLine.WrongUsage, Run(args).Code);

    [Fact]
    public void No_arguments_show_the_help_and_exit_with_two() => Assert.Equal(CommandLine.WrongUsage, Run().Code);

    [Fact]
    public void A_missing_file_is_refused_by_name()
    {
        var (code, _, error) = Run("check", In("absent.json"));
        Assert.Equal(CommandLine.Refused, code);
        Assert.Contains("absent.json", error, StringComparison.Ordinal);
    }

    [Fact]
    public void Record_says_what_a_flow_file_holds()
    {
        var (code, output, _) = Run("record", Path.Combine(Path.GetDirectoryName(Site("larkspur-drop"))!, "flow.csv"));
        Assert.Equal(CommandLine.Done, code);
        // 2011 to 2022 is 4383 days, thirteen of them blank on purpose.
        Assert.Contains("4,383 days", output, StringComparison.Ordinal);
        Assert.Contains("Days with a value: 4,370", output, StringComparison.Ordinal);
    }

    [Fact]
    public void Record_refuses_what_is_not_a_flow_file_with_a_reason()
    {
        File.WriteAllText(In("x.csv"), "colour,size\nred,3\n");
        var (code, _, error) = Run("record", In("x.csv"));
        Assert.Equal(CommandLine.Refused, code);
        Assert.Contains("x.csv", error, StringComparison.Ordinal);
    }

    [Fact]
    public void Record_tells_the_quality_and_obeys_the_choices()
    {
        File.WriteAllText(In("q.csv"), "date,flow_m3/s\n2020-01-01,5\n2020-01-02,-1\n2020-01-03,7\nTotal,11\n");
        Assert.Equal(CommandLine.Refused, Run("record", In("q.csv")).Code);
        var (code, output, _) = Run("record", In("q.csv"), "--negatives", "kept out", "--gaps", "interpolated up to 2 days", "--write", In("out.csv"));
        Assert.Equal(CommandLine.Done, code);
        Assert.Contains("Found: Rows of totals or means: 1 (row 5: Total, 11); left out", output, StringComparison.Ordinal);
        Assert.Contains("Policy: Gaps of up to 2 days are filled by a straight line", output, StringComparison.Ordinal);
        Assert.Equal("date,flow (m3/s)\n2020-01-01,5\n2020-01-02,6\n2020-01-03,7\n", File.ReadAllText(In("out.csv")));
        var (wrong, _, error) = Run("record", In("q.csv"), "--negatives", "eaten");
        Assert.Equal(CommandLine.Refused, wrong);
        Assert.Contains("zeroed", error, StringComparison.Ordinal);
    }

    [Fact]
    public void Record_proposes_a_recipe_and_reads_by_it()
    {
        File.WriteAllText(In("r.txt"), "Canal;;\nFecha;Caudal;Nota\n12/04/2020;1,5;A\n13/04/2020;2,25;A\n");
        var (asked, proposal, why) = Run("record", In("r.txt"), "--propose");
        Assert.Equal(CommandLine.Refused, asked);
        Assert.Contains("'13/04/2020' occurs in row 4, so the day comes first", why, StringComparison.Ordinal);
        Assert.Contains("unit: question:", why, StringComparison.Ordinal);
        File.WriteAllText(In("recipe.json"), proposal.Replace("\"valueColumn\"", "\"unit\": \"m3/s\", \"valueColumn\"", StringComparison.Ordinal));
        var (code, output, error) = Run("record", In("r.txt"), "--recipe", In("recipe.json"));
        Assert.Equal("", error);
        Assert.Equal(CommandLine.Done, code);
        Assert.Contains("Period: 2020-04-12 to 2020-04-13", output, StringComparison.Ordinal);
        File.WriteAllText(In("recipe.json"), "{ \"seperator\": \"comma\" }");
        Assert.Equal(CommandLine.Refused, Run("record", In("r.txt"), "--recipe", In("recipe.json")).Code);
    }

    [Fact]
    public void Record_reads_levels_by_a_rating_and_counts_those_outside()
    {
        File.WriteAllText(In("levels.csv"), "date,stage_m\n2020-01-01,1.5\n2020-01-02,2.5\n2020-01-03,9\n");
        File.WriteAllText(In("rating.json"), "{ \"kind\": \"table\", \"rows\": [ { \"level\": \"1 m\", \"flow\": \"0 m3/s\" }, { \"level\": \"3 m\", \"flow\": \"4 m3/s\" } ] }");
        var (code, output, error) = Run("record", In("levels.csv"), "--rating", In("rating.json"), "--write", In("flows.csv"));
        Assert.Equal("", error);
        Assert.Equal(CommandLine.Done, code);
        Assert.Contains("Water levels outside the rating: 1 (row 4", output, StringComparison.Ordinal);
        Assert.StartsWith("date,flow (m3/s)\n2020-01-01,1\n2020-01-02,3\n", File.ReadAllText(In("flows.csv")), StringComparison.Ordinal);
        File.WriteAllText(In("rating.json"), "{ \"knid\": \"table\" }");
        Assert.Equal(CommandLine.Refused, Run("record", In("levels.csv"), "--rating", In("rating.json")).Code);
    }

    private static string Site(string name)
    {
        for (var at = new DirectoryInfo(AppContext.BaseDirectory); at is not null; at = at.Parent)
        {
            if (File.Exists(Path.Combine(at.FullName, "HeadToWatts.sln")))
                return Path.Combine(at.FullName, "sitedata", name, "study.json");
        }

        throw new DirectoryNotFoundException("HeadToWatts.sln is not above the tests");
    }

    private string In(string name) => Path.Combine(_folder, name);

    private static (int Code, string Output, string Error) Run(params string[] args) => RunWith("", args);

    private static (int Code, string Output, string Error) RunWith(string input, params string[] args)
    {
        using var output = new StringWriter { NewLine = "\n" };
        using var error = new StringWriter { NewLine = "\n" };
        var code = CommandLine.Run(args, output, error, () => new MemoryStream(Encoding.UTF8.GetBytes(input)));
        return (code, output.ToString(), error.ToString());
    }
}

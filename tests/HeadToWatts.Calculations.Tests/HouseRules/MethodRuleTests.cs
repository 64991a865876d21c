using HeadToWatts.Basis.Sources;
using HeadToWatts.FlowRecords;
using HeadToWatts.Hydraulics.Pipes;
using HeadToWatts.Studies;
using HeadToWatts.Studies.Cautions;
using HeadToWatts.Turbines;

namespace HeadToWatts.Calculations.Tests.HouseRules;

/// <summary>Every method carries its source and is held to a value from outside the project.</summary>
public class MethodRuleTests
{
    private static readonly string[] Kinds = ["printed", "independent", "agreement", "invariant", "memory"];

    public static TheoryData<string> MethodIds => new(StudyMethods.Catalogue.Select(m => m.Id));

    public static TheoryData<string> CheckFiles => new(
        Directory.GetFiles(CheckValueFile.Folder(), "*.csv", SearchOption.AllDirectories).Select(f => Path.GetRelativePath(CheckValueFile.Folder(), f).Replace('\\', '/')).Order(StringComparer.Ordinal));

    [Theory]
    [MemberData(nameof(MethodIds))]
    public void The_method_has_a_source_a_formula_and_a_value_from_outside(string id)
    {
        var method = StudyMethods.Catalogue.Single(m => m.Id == id);
        Assert.True(method.Name.Length > 0 && method.Source.Title.Length > 0);
        Assert.NotEmpty(FormulaText.Parse(method.Formula));
        Assert.All(method.Ranges, r =>
        {
            Assert.True(r.Lowest < r.Highest, $"{id}: range of {r.Symbol}");
            Assert.True(r.Symbol.Length > 0 && r.Name.Length > 0 && r.Unit.Length > 0, $"{id}: range of {r.Symbol}");
        });

        var files = CheckValueFile.OfMethod(id);
        Assert.True(files.Any(f => f.Rows.Count > 0 && f.Head.GetValueOrDefault("kind") != "memory"), $"{id} has no file under tests/CheckValues/{id}/ with a value from outside");
    }

    [Theory]
    [MemberData(nameof(MethodIds))]
    public void The_check_values_of_the_method_are_read_by_a_test(string id)
    {
        // By the id in a string, by the member that holds the method, or in the loop over all plotting positions.
        var method = StudyMethods.Catalogue.Single(m => m.Id == id);
        var members = House.AllTypes.SelectMany(t => t.GetProperties(All).Where(p => p.PropertyType == typeof(Method) && Is(p.GetValue(null))).Select(p => t.Name + "." + p.Name)
            .Concat(t.GetFields(All).Where(f => f.FieldType == typeof(Method) && Is(f.GetValue(null))).Select(f => t.Name + "." + f.Name)));
        string[] names = ["\"" + id + "\"", .. members.Where(m => !m.Contains('<', StringComparison.Ordinal)).Select(m => m + ".Id")];
        if (PlottingPositions.All.Any(p => p.Method == method))
            names = [.. names, "OfMethod(position.Method.Id)"];
        Assert.True(
            House.Sources("tests", "HeadToWatts.Calculations.Tests").Select(File.ReadAllText).Any(text => names.Any(n => text.Contains(n, StringComparison.Ordinal))),
            $"no test reads the check values of {id}");

        bool Is(object? value) => value is Method m && m.Id == method.Id;
    }

    [Theory]
    [MemberData(nameof(CheckFiles))]
    public void The_check_file_says_where_its_values_come_from_and_how_close_they_must_be_met(string path)
    {
        var file = CheckValueFile.Read(Path.Combine(CheckValueFile.Folder(), path));
        Assert.All(["source", "place", "kind", "tolerance", "why"], key => Assert.True(file.Head.GetValueOrDefault(key, "").Length > 0, $"{path} has no '# {key}:'"));
        Assert.Contains(file.Head["kind"], Kinds);
        Assert.Matches(@"^(rel|abs) \d", file.Head["tolerance"]);
        Assert.NotEmpty(file.Rows);
    }

    [Fact]
    public void Every_folder_of_check_values_belongs_to_something()
    {
        var known = StudyMethods.Catalogue.Select(m => m.Id).Append("units").ToHashSet(StringComparer.Ordinal);
        Assert.All(Directory.GetDirectories(CheckValueFile.Folder()).Select(d => Path.GetFileName(d)!), d => Assert.True(known.Contains(d), $"tests/CheckValues/{d} belongs to no method"));
    }

    [Fact]
    public void Every_decision_that_is_cited_has_its_page()
    {
        var pages = Directory.GetFiles(Path.Combine(CheckValueFile.Root(), "docs", "decisions"), "*.md").Select(f => Path.GetFileName(f)!).ToList();
        var cited = AllSources().Where(s => s.Kind == SourceKind.Decision).Distinct().ToList();
        Assert.NotEmpty(cited);
        Assert.All(cited, s => Assert.True(
            s.Place.StartsWith("decision ", StringComparison.Ordinal) && pages.Any(p => p.StartsWith(s.Place["decision ".Length..] + "-", StringComparison.Ordinal)),
            $"'{s.Place}' ({s.Title}) has no page in docs/decisions"));
    }

    [Fact]
    public void Sources_with_the_same_key_say_the_same()
    {
        Assert.All(AllSources().GroupBy(s => s.Id), g => Assert.True(g.Distinct().Count() == 1, $"the source '{g.Key}' is written in more than one way: {string.Join(" / ", g.Distinct())}"));
    }

    [Fact]
    public void Every_figure_of_a_turbine_type_has_a_source() =>
        Assert.All(TurbineTypes.All, t => Assert.Equal(Enum.GetValues<TurbineFigure>(), t.Sources.Select(s => s.Figure).Distinct().Order()));

    private static IEnumerable<Source> AllSources() => StudyMethods.Catalogue.Select(m => m.Source)
        .Concat(TurbineTypes.All.SelectMany(t => t.Sources.Select(s => s.Source)))
        .Concat(CautionRules.All.Select(r => r.Authority))
        .Concat(PipeMaterials.All.Select(m => m.Source))
        .Concat(House.StaticsOf<Source>());

    private const System.Reflection.BindingFlags All = System.Reflection.BindingFlags.Static | System.Reflection.BindingFlags.Public | System.Reflection.BindingFlags.NonPublic | System.Reflection.BindingFlags.DeclaredOnly;
}

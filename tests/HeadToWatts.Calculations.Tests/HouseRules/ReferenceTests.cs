using System.Xml.Linq;

namespace HeadToWatts.Calculations.Tests.HouseRules;

/// <summary>The order in which water becomes a memo: nothing points back.</summary>
public class ReferenceTests
{
    // Direct references of the plan; a project may also name what these reach.
    private static readonly Dictionary<string, string[]> MayReference = new(StringComparer.Ordinal)
    {
        ["Basis"] = [],
        ["FlowRecords"] = ["Basis"],
        ["Hydraulics"] = ["Basis"],
        ["Turbines"] = ["Basis"],
        ["EnergyYield"] = ["FlowRecords", "Hydraulics", "Turbines"],
        ["Pumping"] = ["Hydraulics", "FlowRecords"],
        ["Economics"] = ["EnergyYield", "Pumping"],
        ["Studies"] = ["Economics"],
        ["Files"] = ["Studies"],
        ["Drawings"] = ["Studies"],
        ["Memos"] = ["Drawings"],
        ["Storage"] = ["Files"],
        ["Cli"] = ["Files", "Memos"],
        ["Web"] = ["Files", "Memos", "Drawings", "Storage"],
    };

    private static readonly Dictionary<string, string> OnlyUser = new(StringComparer.OrdinalIgnoreCase)
    {
        ["CsvHelper"] = "Files",
        ["PDFsharp"] = "Memos",
        ["Radzen.Blazor"] = "Web",
    };

    private static readonly IReadOnlyList<(string Name, XDocument Xml)> Projects =
    [
        .. Directory.GetFiles(Path.Combine(CheckValueFile.Root(), "src"), "*.csproj", SearchOption.AllDirectories)
            .Order(StringComparer.Ordinal)
            .Select(f => (Path.GetFileNameWithoutExtension(f)["HeadToWatts.".Length..], XDocument.Load(f))),
    ];

    [Fact]
    public void Every_project_has_its_place_in_the_house() =>
        Assert.All(Projects, p => Assert.True(MayReference.ContainsKey(p.Name), $"HeadToWatts.{p.Name} is not in the plan of the house"));

    [Fact]
    public void No_project_points_back()
    {
        foreach (var (name, xml) in Projects)
        {
            var allowed = Reach(name);
            foreach (var reference in xml.Descendants("ProjectReference"))
            {
                var target = Path.GetFileNameWithoutExtension(((string)reference.Attribute("Include")!).Replace('\\', '/'))["HeadToWatts.".Length..];
                Assert.True(allowed.Contains(target), $"HeadToWatts.{name} may not reference HeadToWatts.{target}");
            }
        }
    }

    [Fact]
    public void Calculation_projects_use_no_package_but_the_numerics()
    {
        foreach (var (name, xml) in Projects.Where(p => House.CalculationProjects.Contains(p.Name)))
        {
            Assert.All(Packages(xml), p => Assert.True(p == "MathNet.Numerics", $"HeadToWatts.{name} uses {p}"));
            Assert.Equal("Microsoft.NET.Sdk", (string)xml.Root!.Attribute("Sdk")!);
            Assert.Empty(xml.Descendants("FrameworkReference"));
        }
    }

    [Fact]
    public void Compiled_calculations_reach_nothing_but_the_runtime_the_numerics_and_what_stands_before_them()
    {
        foreach (var assembly in House.Calculations)
        {
            var name = assembly.GetName().Name!["HeadToWatts.".Length..];
            var allowed = Reach(name);
            Assert.All(assembly.GetReferencedAssemblies(), r => Assert.True(
                r.Name!.StartsWith("System.", StringComparison.Ordinal) || r.Name is "MathNet.Numerics"
                || (r.Name.StartsWith("HeadToWatts.", StringComparison.Ordinal) && allowed.Contains(r.Name["HeadToWatts.".Length..])),
                $"HeadToWatts.{name} reaches {r.Name}"));
        }
    }

    [Fact]
    public void A_package_with_one_user_has_that_user_only() =>
        Assert.All(Projects, p => Assert.All(Packages(p.Xml), package => Assert.True(!OnlyUser.TryGetValue(package, out var user) || user == p.Name, $"HeadToWatts.{p.Name} uses {package}")));

    [Fact]
    public void Calculation_projects_are_compiled_with_the_list_of_banned_symbols()
    {
        var props = File.ReadAllText(Path.Combine(CheckValueFile.Root(), "Directory.Build.props"));
        Assert.Contains("src/BannedSymbols.txt", props);
        Assert.All(House.CalculationProjects, p => Assert.Contains($"'HeadToWatts.{p}'", props));
        var banned = File.ReadAllText(Path.Combine(CheckValueFile.Root(), "src", "BannedSymbols.txt"));
        Assert.All(["System.IO.File;", "System.DateTime.Now", "System.Random", "CultureInfo.CurrentCulture", "System.Guid.NewGuid"], b => Assert.Contains(b, banned));
    }

    private static HashSet<string> Reach(string name)
    {
        var reach = new HashSet<string>(StringComparer.Ordinal);
        var open = new Stack<string>(MayReference[name]);
        while (open.TryPop(out var next))
        {
            if (reach.Add(next))
            {
                foreach (var further in MayReference[next])
                    open.Push(further);
            }
        }

        return reach;
    }

    private static IEnumerable<string> Packages(XDocument xml) => xml.Descendants("PackageReference").Select(r => (string)r.Attribute("Include")!);
}

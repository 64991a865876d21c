namespace HeadToWatts.Calculations.Tests.HouseRules;

public class SourceTextTests
{
    private const int MostLines = 400;

    // Put together from halves, so that this file does not name what it forbids.
    private static readonly string[] Banned = ["TO" + "DO", "FIX" + "ME", "HA" + "CK:", "Not" + "ImplementedException", "Skip" + " = \"", "Skip" + "=\"", "Thread" + ".Sleep("];

    [Fact]
    public void No_calculation_file_is_longer_than_can_be_read_in_one_sitting() =>
        Assert.All(
            House.CalculationProjects.Where(p => Directory.Exists(Path.Combine(CheckValueFile.Root(), "src", "HeadToWatts." + p))).SelectMany(p => House.Sources("src", "HeadToWatts." + p)),
            f => Assert.True(File.ReadLines(f).Count() <= MostLines, $"{f} has more than {MostLines} lines: which of its reasons to change belongs elsewhere?"));

    [Fact]
    public void Nothing_is_left_undone_or_skipped() =>
        Assert.All(
            House.Sources("src").Concat(House.Sources("tests")),
            f =>
            {
                var text = File.ReadAllText(f);
                Assert.All(Banned, b => Assert.False(text.Contains(b, StringComparison.Ordinal), $"{f} contains '{b}'"));
            });

    [Fact]
    public void A_namespace_says_the_folder() =>
        Assert.All(
            House.CalculationProjects.Where(p => Directory.Exists(Path.Combine(CheckValueFile.Root(), "src", "HeadToWatts." + p))).SelectMany(p => House.Sources("src", "HeadToWatts." + p)),
            f =>
            {
                var folder = Path.GetRelativePath(Path.Combine(CheckValueFile.Root(), "src"), Path.GetDirectoryName(f)!).Replace(Path.DirectorySeparatorChar, '.');
                Assert.Contains($"namespace {folder};", File.ReadAllText(f));
            });

    [Fact]
    public void Every_stage_has_its_mirror_in_the_tests() =>
        Assert.All(House.Calculations, a => Assert.True(
            Directory.Exists(Path.Combine(CheckValueFile.Root(), "tests", "HeadToWatts.Calculations.Tests", a.GetName().Name!["HeadToWatts.".Length..])), $"{a.GetName().Name} has no folder of tests"));
}

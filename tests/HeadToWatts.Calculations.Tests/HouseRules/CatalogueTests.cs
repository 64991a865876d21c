using HeadToWatts.Basis.Sources;
using HeadToWatts.Basis.Units;
using HeadToWatts.FlowRecords;
using HeadToWatts.Hydraulics.Friction;
using HeadToWatts.Hydraulics.LocalLosses;
using HeadToWatts.Hydraulics.Pipes;
using HeadToWatts.Studies;
using HeadToWatts.Studies.Cautions;
using HeadToWatts.Turbines;
using HeadToWatts.Turbines.Sizing;

namespace HeadToWatts.Calculations.Tests.HouseRules;

/// <summary>What is written is listed: an entry that its list forgets would be dead.</summary>
public class CatalogueTests
{
    [Fact]
    public void Every_friction_formula_is_listed() => Listed<FrictionFormula>(FrictionFormulas.All);

    [Fact]
    public void Every_caution_rule_is_listed() => Listed<CautionRule>(CautionRules.All);

    [Fact]
    public void Every_runner_speed_rule_belongs_to_a_turbine_type() => Listed<RunnerSpeedRule>(TurbineTypes.All.Where(t => t.OwnSpeedRule is not null).Select(t => t.OwnSpeedRule!));

    [Fact]
    public void Every_rule_for_the_size_of_a_runner_belongs_to_a_turbine_type() => Listed<RunnerSizing>(TurbineTypes.All.Where(t => t.Sizing is not null).Select(t => t.Sizing!));

    [Fact]
    public void Every_turbine_type_is_listed_and_every_folder_holds_one()
    {
        Assert.All(House.StaticsOf<TurbineType>(), t => Assert.Contains(t, TurbineTypes.All));
        var folders = Directory.GetDirectories(Path.Combine(CheckValueFile.Root(), "src", "HeadToWatts.Turbines")).Select(d => Path.GetFileName(d)!).Where(d => d is not ("bin" or "obj" or "Units" or "Sizing")).ToList();
        Assert.Equal(folders.Count, TurbineTypes.All.Count);
        foreach (var folder in folders)
        {
            var holders = typeof(TurbineTypes).Assembly.GetTypes().Where(t => t.Namespace == $"HeadToWatts.Turbines.{folder}");
            Assert.True(holders.Any(h => h.GetProperties().Any(p => p.PropertyType == typeof(TurbineType))), $"the folder Turbines/{folder} holds no turbine type");
        }
    }

    [Fact]
    public void Every_plotting_position_and_every_unit_is_listed()
    {
        Assert.All(House.StaticsOf<PlottingPosition>(), p => Assert.Contains(p, PlottingPositions.All));
        Assert.All(House.StaticsOf<UnitOfMeasure>(), u => Assert.Contains(u, UnitTable.All));
    }

    [Fact]
    public void Every_method_is_in_the_catalogue()
    {
        Assert.All(House.StaticsOf<Method>(), m => Assert.Contains(StudyMethods.Catalogue, c => c.Id == m.Id));
        Assert.All(FrictionFormulas.All, f => Assert.Contains(f.Method, StudyMethods.Catalogue));
        Assert.All(PlottingPositions.All, p => Assert.Contains(p.Method, StudyMethods.Catalogue));
    }

    [Fact]
    public void Keys_are_unique_and_plain()
    {
        Unique(StudyMethods.Catalogue.Select(m => m.Id));
        Unique(TurbineTypes.All.Select(t => t.Id));
        Unique(FrictionFormulas.All.Select(f => f.Id));
        Unique(PipeMaterials.All.Select(m => m.Id));
        Unique(FittingKinds.All.Select(f => f.Id));
        Unique(PlottingPositions.All.Select(p => p.Id));
        Unique(CautionRules.All.Select(r => r.Id));

        static void Unique(IEnumerable<string> ids)
        {
            var list = ids.ToList();
            Assert.NotEmpty(list);
            Assert.Equal(list.Count, list.Distinct(StringComparer.OrdinalIgnoreCase).Count());
            Assert.All(list, id => Assert.Matches("^[a-z0-9]+(-[a-z0-9]+)*$", id));
        }
    }

    private static void Listed<T>(IEnumerable<T> list)
        where T : class
    {
        var listed = list.Select(x => x.GetType()).ToHashSet();
        var written = House.AllTypes.Where(t => typeof(T).IsAssignableFrom(t) && !t.IsAbstract).ToList();
        Assert.NotEmpty(written);
        Assert.All(written, t => Assert.True(listed.Contains(t), $"{t.FullName} is in no list"));
    }
}

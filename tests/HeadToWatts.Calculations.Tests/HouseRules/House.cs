using System.Reflection;
using HeadToWatts.Basis.Units;
using HeadToWatts.Economics;
using HeadToWatts.EnergyYield;
using HeadToWatts.FlowRecords;
using HeadToWatts.Hydraulics;
using HeadToWatts.Pumping;
using HeadToWatts.Studies;
using HeadToWatts.Turbines;

namespace HeadToWatts.Calculations.Tests.HouseRules;

/// <summary>The calculation assemblies and the source tree, for the rules of the house.</summary>
internal static class House
{
    /// <summary>The calculation projects there are, in the order of the flow.</summary>
    public static readonly IReadOnlyList<Assembly> Calculations =
    [
        typeof(UnitTable).Assembly, typeof(FlowRecordMethods).Assembly, typeof(HydraulicsMethods).Assembly, typeof(TurbineTypes).Assembly,
        typeof(EnergyMethods).Assembly, typeof(PumpingMethods).Assembly, typeof(EconomicsMethods).Assembly, typeof(Study).Assembly,
    ];

    /// <summary>Names of the projects that may hold calculations only; those not built yet are named already.</summary>
    public static readonly IReadOnlyList<string> CalculationProjects = ["Basis", "FlowRecords", "Hydraulics", "Turbines", "EnergyYield", "Pumping", "Economics", "Studies"];

    public static IEnumerable<Type> PublicTypes => Calculations.SelectMany(a => a.GetExportedTypes());

    public static IEnumerable<Type> AllTypes => Calculations.SelectMany(a => a.GetTypes());

    /// <summary>Source files of the tree, without what the compiler makes.</summary>
    public static IEnumerable<string> Sources(params string[] under) =>
        Directory.EnumerateFiles(Path.Combine([CheckValueFile.Root(), .. under]), "*.cs", SearchOption.AllDirectories)
            .Where(f => !f.Split(Path.DirectorySeparatorChar).Any(p => p is "bin" or "obj"));

    /// <summary>Every value of a type that stands in a static field or property, public or not.</summary>
    public static IEnumerable<T> StaticsOf<T>()
        where T : class
    {
        const BindingFlags all = BindingFlags.Static | BindingFlags.Public | BindingFlags.NonPublic | BindingFlags.DeclaredOnly;
        foreach (var type in AllTypes.Where(t => !t.ContainsGenericParameters))
        {
            foreach (var property in type.GetProperties(all).Where(p => typeof(T).IsAssignableFrom(p.PropertyType) && p.GetIndexParameters().Length == 0))
                yield return (T)property.GetValue(null)!;
            foreach (var field in type.GetFields(all).Where(f => typeof(T).IsAssignableFrom(f.FieldType) && !f.Name.Contains('<', StringComparison.Ordinal)))
            {
                if (field.GetValue(null) is T value)
                    yield return value;
            }
        }
    }
}

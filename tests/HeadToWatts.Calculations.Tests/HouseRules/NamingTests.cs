using System.Reflection;
using System.Text.RegularExpressions;

namespace HeadToWatts.Calculations.Tests.HouseRules;

/// <summary>Every number carries its unit in its name, or is a ratio or coefficient that docs/nomenclature.md names.</summary>
public partial class NamingTests
{
    // Longer ones first: the unit is what stands at the end.
    private static readonly string[] Units =
    [
        "M3PerS", "M2PerS", "MPerS2", "MPerS", "KgPerM3", "NPerM3", "KnPerM3", "JPerKg", "PaS", "DegC", "Kwh", "Kw", "KwM", "W", "Pa", "Rad", "Rpm", "Hz",
        "M", "M2", "M3", "Km2", "S", "Metres", "Hours", "Years", "Ft", "UsHp", "MetricHp", "MetricHpM", "UsHpFt", "Decades", "DecadesOutside", "V", "A", "Ohm", "Kva", "Mm", "Mm2",
        "Amount", // of money, in the currency and price year of the basis beside it
    ];

    [Fact]
    public void Every_double_says_its_unit_or_stands_in_the_nomenclature()
    {
        var page = File.ReadAllText(Path.Combine(CheckValueFile.Root(), "docs", "nomenclature.md"));
        var named = CodeNames().Matches(page).Select(m => m.Groups[1].Value).ToHashSet(StringComparer.Ordinal);
        var strangers = Doubles().Where(d => !HasUnit(d.Name) && !named.Contains(Camel(d.Name))).Select(d => $"{d.Name} ({d.Where})").Distinct().Order(StringComparer.Ordinal).ToList();
        Assert.True(strangers.Count == 0, "These numbers carry no unit in their name and are not in docs/nomenclature.md:\n" + string.Join("\n", strangers));
    }

    [Fact]
    public void The_nomenclature_names_nothing_that_is_gone()
    {
        // A name in the table of ratios and coefficients must be in use somewhere in the product.
        var page = File.ReadAllText(Path.Combine(CheckValueFile.Root(), "docs", "nomenclature.md"));
        var table = page[page.IndexOf("## Numbers without a unit", StringComparison.Ordinal)..];
        var names = CodeNames().Matches(table).Select(m => m.Groups[1].Value).Distinct().ToList();
        Assert.True(names.Count > 10);
        var used = Doubles().Select(d => Camel(d.Name)).ToHashSet(StringComparer.Ordinal);
        Assert.All(names, n => Assert.True(used.Contains(n), $"docs/nomenclature.md names `{n}`, which no public member has"));
    }

    private static bool HasUnit(string name) => name is "metres" or "hours" || Units.Any(u => name.EndsWith(u, StringComparison.Ordinal)
        && (name.Length == u.Length || char.IsLower(name[^(u.Length + 1)]) || char.IsDigit(name[^(u.Length + 1)])));

    private static string Camel(string name) => char.ToLowerInvariant(name[0]) + name[1..];

    private static IEnumerable<(string Name, string Where)> Doubles()
    {
        const BindingFlags all = BindingFlags.Public | BindingFlags.Instance | BindingFlags.Static | BindingFlags.DeclaredOnly;
        foreach (var type in House.PublicTypes.Where(t => !typeof(Delegate).IsAssignableFrom(t)))
        {
            foreach (var property in type.GetProperties(all).Where(p => IsDouble(p.PropertyType)))
                yield return (property.Name, type.Name);
            foreach (var field in type.GetFields(all).Where(f => IsDouble(f.FieldType)))
                yield return (field.Name, type.Name);
            foreach (var method in type.GetConstructors(all).Cast<MethodBase>().Concat(type.GetMethods(all).Where(m => !m.IsSpecialName && m.Name is not ("Deconstruct" or "Equals" or "CompareTo"))))
            {
                foreach (var parameter in method.GetParameters().Where(p => IsDouble(p.ParameterType)))
                    yield return (parameter.Name!, $"{type.Name}.{method.Name}");
            }
        }
    }

    private static bool IsDouble(Type type)
    {
        var inner = type.IsByRef ? type.GetElementType()! : type;
        return (Nullable.GetUnderlyingType(inner) ?? inner) == typeof(double);
    }

    [GeneratedRegex("`([a-zA-Z0-9]+)`")]
    private static partial Regex CodeNames();
}

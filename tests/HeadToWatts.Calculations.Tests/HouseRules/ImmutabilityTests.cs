using System.Reflection;
using System.Runtime.CompilerServices;

namespace HeadToWatts.Calculations.Tests.HouseRules;

/// <summary>Results are not changed after they are made.</summary>
public class ImmutabilityTests
{
    private static readonly Type[] Mutable =
    [
        typeof(List<>), typeof(Dictionary<,>), typeof(HashSet<>), typeof(SortedSet<>), typeof(Queue<>), typeof(Stack<>), typeof(SortedDictionary<,>),
        typeof(IList<>), typeof(ICollection<>), typeof(IDictionary<,>), typeof(ISet<>),
    ];

    [Fact]
    public void No_property_can_be_set_after_construction()
    {
        foreach (var type in House.PublicTypes)
        {
            foreach (var property in type.GetProperties(BindingFlags.Public | BindingFlags.Instance | BindingFlags.Static | BindingFlags.DeclaredOnly))
            {
                var setter = property.SetMethod;
                var settable = setter is { IsPublic: true } && !setter.ReturnParameter.GetRequiredCustomModifiers().Contains(typeof(IsExternalInit));
                Assert.False(settable, $"{type.FullName}.{property.Name} can be set");
            }
        }
    }

    [Fact]
    public void No_field_can_be_changed()
    {
        foreach (var type in House.AllTypes.Where(t => !t.Name.Contains('<', StringComparison.Ordinal)))
        {
            foreach (var field in type.GetFields(BindingFlags.Public | BindingFlags.Instance | BindingFlags.Static | BindingFlags.DeclaredOnly).Where(f => !type.IsEnum))
                Assert.True(field.IsInitOnly || field.IsLiteral, $"{type.FullName}.{field.Name} is a public field that can be changed");

            // State between calls would make the same input give another result.
            foreach (var field in type.GetFields(BindingFlags.NonPublic | BindingFlags.Static | BindingFlags.DeclaredOnly).Where(f => !f.Name.Contains('<', StringComparison.Ordinal)))
                Assert.True(field.IsInitOnly || field.IsLiteral, $"{type.FullName}.{field.Name} is static and can be changed");
        }
    }

    [Fact]
    public void No_property_or_field_hands_out_a_collection_that_can_be_changed()
    {
        foreach (var type in House.PublicTypes)
        {
            foreach (var property in type.GetProperties(BindingFlags.Public | BindingFlags.Instance | BindingFlags.Static | BindingFlags.DeclaredOnly))
                Assert.False(IsMutable(property.PropertyType), $"{type.FullName}.{property.Name} is a {property.PropertyType.Name}");
            foreach (var field in type.GetFields(BindingFlags.Public | BindingFlags.Instance | BindingFlags.Static | BindingFlags.DeclaredOnly))
                Assert.False(IsMutable(field.FieldType), $"{type.FullName}.{field.Name} is a {field.FieldType.Name}");
        }
    }

    [Fact]
    public void Classes_are_sealed_abstract_or_static()
    {
        // A result that can be derived from can be changed.
        Assert.All(House.PublicTypes.Where(t => t.IsClass), t => Assert.True(t.IsSealed || t.IsAbstract, $"{t.FullName} can be derived from"));
    }

    private static bool IsMutable(Type type) =>
        type.IsArray || (type.IsGenericType && Mutable.Contains(type.GetGenericTypeDefinition()));
}

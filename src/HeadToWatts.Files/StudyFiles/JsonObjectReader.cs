using System.Globalization;
using System.Text.Json;
using HeadToWatts.Basis.Problems;

namespace HeadToWatts.Files.StudyFiles;

/// <summary>Reads one JSON object field by field and afterwards refuses what was not asked for, with the nearest known name.</summary>
internal sealed class JsonObjectReader
{
    private readonly Dictionary<string, JsonElement> _fields = new(StringComparer.Ordinal);
    private readonly HashSet<string> _known = new(StringComparer.Ordinal);
    private readonly string _path;
    private readonly List<Problem> _problems;

    internal JsonObjectReader(JsonElement element, string path, List<Problem> problems)
    {
        _path = path;
        _problems = problems;
        if (element.ValueKind != JsonValueKind.Object)
        {
            problems.Add(new Problem(path.Length == 0 ? "(whole file)" : path, Shorten(element.GetRawText()), "an object in braces is wanted here"));
            return;
        }

        foreach (var property in element.EnumerateObject())
        {
            if (!_fields.TryAdd(property.Name, property.Value))
                problems.Add(new Problem(At(property.Name), Shorten(property.Value.GetRawText()), "this field stands here twice"));
        }
    }

    internal bool Has(string name) => _fields.ContainsKey(name);

    /// <summary>A text. A bare number is refused where a quantity needs its unit.</summary>
    internal string? Text(string name)
    {
        if (!Take(name, out var value))
            return null;
        if (value.ValueKind == JsonValueKind.String)
            return value.GetString();
        _problems.Add(value.ValueKind == JsonValueKind.Number
            ? new Problem(At(name), value.GetRawText(), "a bare number has no unit; write it as text", "text such as \"18.5 ft\" or \"85 %\"")
            : new Problem(At(name), Shorten(value.GetRawText()), "text in quotes is wanted here"));
        return null;
    }

    /// <summary>A pure number, written as a number or as text.</summary>
    internal string? NumberText(string name)
    {
        if (!Take(name, out var value))
            return null;
        if (value.ValueKind is JsonValueKind.Number)
            return value.GetRawText();
        if (value.ValueKind is JsonValueKind.String)
            return value.GetString();
        _problems.Add(new Problem(At(name), Shorten(value.GetRawText()), "a number is wanted here"));
        return null;
    }

    internal int? Integer(string name)
    {
        if (!Take(name, out var value))
            return null;
        if (value.ValueKind == JsonValueKind.Number && value.TryGetInt32(out var number))
            return number;
        _problems.Add(new Problem(At(name), Shorten(value.GetRawText()), "a whole number is wanted here"));
        return null;
    }

    internal T? Object<T>(string name, Func<JsonObjectReader, T> read)
        where T : class
    {
        if (!Take(name, out var value))
            return null;
        var reader = new JsonObjectReader(value, At(name), _problems);
        var result = read(reader);
        reader.Done();
        return result;
    }

    internal List<T>? Array<T>(string name, Func<JsonObjectReader, T> read)
    {
        if (!Take(name, out var value))
            return null;
        if (value.ValueKind != JsonValueKind.Array)
        {
            _problems.Add(new Problem(At(name), Shorten(value.GetRawText()), "a list in square brackets is wanted here"));
            return null;
        }

        var list = new List<T>();
        foreach (var (item, i) in value.EnumerateArray().Select((v, i) => (v, i)))
        {
            var reader = new JsonObjectReader(item, $"{At(name)}[{i.ToString(CultureInfo.InvariantCulture)}]", _problems);
            list.Add(read(reader));
            reader.Done();
        }

        return list;
    }

    /// <summary>A list of texts.</summary>
    internal List<string?>? Texts(string name)
    {
        if (!Take(name, out var value))
            return null;
        if (value.ValueKind != JsonValueKind.Array || value.EnumerateArray().Any(v => v.ValueKind != JsonValueKind.String))
        {
            _problems.Add(new Problem(At(name), Shorten(value.GetRawText()), "a list of texts in square brackets is wanted here"));
            return null;
        }

        return [.. value.EnumerateArray().Select(v => v.GetString())];
    }

    /// <summary>A list of texts or pure numbers.</summary>
    internal List<string>? TextsOrNumbers(string name)
    {
        if (!Take(name, out var value))
            return null;
        if (value.ValueKind == JsonValueKind.Array && value.EnumerateArray().All(v => v.ValueKind is JsonValueKind.String or JsonValueKind.Number))
            return [.. value.EnumerateArray().Select(v => v.ValueKind == JsonValueKind.String ? v.GetString()! : v.GetRawText())];
        _problems.Add(new Problem(At(name), Shorten(value.GetRawText()), "a list of texts in square brackets is wanted here"));
        return null;
    }

    /// <summary>Refuses every field that was not asked for.</summary>
    internal void Done()
    {
        foreach (var (name, value) in _fields)
        {
            if (_known.Contains(name))
                continue;
            var nearest = NearestName.Of(name, _known);
            _problems.Add(new Problem(
                At(name),
                Shorten(value.GetRawText()),
                nearest is null ? "this field is not known" : $"this field is not known; perhaps '{nearest}' was meant",
                string.Join(", ", _known)));
        }
    }

    private static string Shorten(string text) => text.Length <= 60 ? text : text[..57] + "...";

    private bool Take(string name, out JsonElement value)
    {
        _known.Add(name);
        return _fields.TryGetValue(name, out value) && value.ValueKind != JsonValueKind.Null;
    }

    private string At(string name) => _path.Length == 0 ? name : _path + "." + name;
}

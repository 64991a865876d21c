using HeadToWatts.Basis.Problems;
using HeadToWatts.Basis.Units;
using HeadToWatts.Files.FlowFiles;
using HeadToWatts.Files.FlowFiles.Recipes;
using HeadToWatts.FlowRecords;

namespace HeadToWatts.Files.StudyFiles;

/// <summary>Flow files that stand beside a study file.</summary>
/// <param name="open">Opens a named file, or gives null when there is none.</param>
public sealed class FolderFlowFiles(Func<string, Stream?> open) : IFlowFileSource
{
    /// <summary>Files in a folder; a name may not lead out of it.</summary>
    /// <param name="folder">The folder of the study file.</param>
    public static FolderFlowFiles In(string folder) => new(name =>
    {
        var root = Path.GetFullPath(folder) + Path.DirectorySeparatorChar;
        var path = Path.GetFullPath(Path.Combine(root, name));
        return path.StartsWith(root, StringComparison.Ordinal) && File.Exists(path) ? File.OpenRead(path) : null;
    });

    /// <inheritdoc/>
    public Checked<DailyRecord> Read(RecordDocument record, string where)
    {
        ArgumentNullException.ThrowIfNull(record);
        var problems = new List<Problem>();
        if (!TryOptions(record, where, problems, out var options))
            return Checked.Refused<DailyRecord>(problems);
        Stream? stream;
        try
        {
            stream = open(record.File!);
        }
        catch (Exception e) when (e is IOException or UnauthorizedAccessException or ArgumentException or NotSupportedException)
        {
            return Checked.Refused<DailyRecord>(new Problem(where, record.File!, "the file cannot be opened: " + e.Message));
        }

        if (stream is null)
            return Checked.Refused<DailyRecord>(new Problem(where, record.File!, "there is no such file beside the study", "the name of a flow file in the study's folder"));
        using (stream)
        {
            var reading = FlowFileReader.Read(record.File!, stream, options);
            if (!reading.TryGet(out var file))
                return Checked.Refused<DailyRecord>(reading.Problems);
            return file.Record is { } days
                ? Checked.Of(days)
                : Checked.Refused<DailyRecord>(new Problem(where, record.File!, "the file holds a duration curve, not a daily record; write its rows as the study's curve"));
        }
    }

    /// <summary>What a study says of a flow file, as options for reading it.</summary>
    /// <param name="record">What the study says.</param>
    /// <param name="where">Field that names the file.</param>
    /// <param name="problems">Receives the problems.</param>
    /// <param name="options">The options.</param>
    public static bool TryOptions(RecordDocument record, string where, ICollection<Problem> problems, out FlowFileOptions options)
    {
        ArgumentNullException.ThrowIfNull(record);
        ArgumentNullException.ThrowIfNull(problems);
        var count = problems.Count;
        UnitOfMeasure? unit = null;
        if (!string.IsNullOrWhiteSpace(record.Unit))
        {
            var dimension = record.Rating is null ? Dimension.Flow : Dimension.Length;
            unit = UnitTable.Find(dimension, record.Unit.Trim());
            if (unit is null)
                problems.Add(new Problem(where.Replace(".file", ".unit", StringComparison.Ordinal), record.Unit, record.Rating is null ? "this unit of flow is not known" : "with a rating the file holds water levels; this unit of length is not known", QuantityText.Accepted(dimension)));
        }

        DateOrder? order = record.DateOrder?.Trim().ToUpperInvariant() switch
        {
            "MONTH-DAY" => DateOrder.MonthFirst,
            "DAY-MONTH" => DateOrder.DayFirst,
            _ => null,
        };
        if (order is null && !string.IsNullOrWhiteSpace(record.DateOrder))
            problems.Add(new Problem(where.Replace(".file", ".dateOrder", StringComparison.Ordinal), record.DateOrder, "this order is not known", "month-day or day-month"));
        var beside = where.Replace(".file", "", StringComparison.Ordinal);
        var policies = PolicyBuilder.Policies(record.Policies, beside + ".policies", problems);
        var subDaily = PolicyBuilder.SubDaily(record.Policies, beside + ".policies", problems);
        ReadingRecipe? recipe = null;
        if (record.Recipe is not null)
            RecipeBuilder.Build(record.Recipe, beside + ".recipe").TryGet(problems, out recipe);
        StageReading? stage = null;
        if (record.Rating is not null)
            RatingBuilder.Build(record.Rating, beside + ".rating").TryGet(problems, out stage);
        options = new FlowFileOptions(unit, order, string.IsNullOrWhiteSpace(record.Column) ? null : record.Column, Policies: policies, SubDaily: subDaily, Recipe: recipe, Stage: stage);
        return problems.Count == count;
    }
}

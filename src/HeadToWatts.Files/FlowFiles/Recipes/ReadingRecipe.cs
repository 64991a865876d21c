using HeadToWatts.Basis.Units;

namespace HeadToWatts.Files.FlowFiles.Recipes;

/// <summary>Order of the parts of a date, or a spreadsheet's count of days.</summary>
public enum RecipeDateOrder
{
    /// <summary>2020-04-13, 20200413, 200413.</summary>
    YearMonthDay,

    /// <summary>4/13/2020.</summary>
    MonthDayYear,

    /// <summary>13.4.2020.</summary>
    DayMonthYear,

    /// <summary>43934.25: days from 30 December 1899.</summary>
    SpreadsheetDay,
}

/// <summary>Which clock the times of a file are of.</summary>
/// <param name="Zone">The place whose clock changes to daylight-saving time; null otherwise.</param>
/// <param name="OffsetMin">Minutes ahead of UTC of a clock that stands still; null when that is not known.</param>
public sealed record RecipeClock(TimeZoneInfo? Zone = null, short? OffsetMin = null)
{
    /// <summary>Times as written; jumps of an hour on a Sunday of spring and autumn show a daylight-saving clock.</summary>
    public static RecipeClock AsWritten { get; } = new();

    /// <summary>True for a clock that never changes to daylight-saving time.</summary>
    public bool StandsStill => OffsetMin is not null;
}

/// <summary>
/// How a table of text is read: kept with the study, so that the same file reads the same way again. Columns are numbers from 1
/// or names of the header.
/// </summary>
public sealed record ReadingRecipe
{
    /// <summary>Stands for any run of blanks as a separator.</summary>
    public const char Blanks = ' ';

    /// <summary>Sign between cells; <see cref="Blanks"/> for runs of blanks. Not used with <see cref="Widths"/>.</summary>
    public char Separator { get; init; } = ',';

    /// <summary>Widths of columns in characters, for a file of fixed widths; empty otherwise.</summary>
    public IReadOnlyList<int> Widths { get; init; } = [];

    /// <summary>Lines at the top that are passed over.</summary>
    public int SkipRows { get; init; }

    /// <summary>Rows of names after them; the last one counts. Blank lines and comments do not count.</summary>
    public int HeaderRows { get; init; }

    /// <summary>Rows of units after the names.</summary>
    public int UnitsRows { get; init; }

    /// <summary>The column of dates, or three columns: year, month, day.</summary>
    public IReadOnlyList<string> DateColumns { get; init; } = ["1"];

    /// <summary>Order of the parts of a date; null while it is not decided.</summary>
    public RecipeDateOrder? DateOrder { get; init; }

    /// <summary>First year of the hundred that years of two digits stand for; null refuses them.</summary>
    public int? TwoDigitYearsFrom { get; init; }

    /// <summary>The column of times of day; null when there is none or they stand with the dates.</summary>
    public string? TimeColumn { get; init; }

    /// <summary>Decimal sign.</summary>
    public char DecimalSign { get; init; } = '.';

    /// <summary>Sign between thousands; null for none.</summary>
    public char? ThousandsSign { get; init; }

    /// <summary>Marks of a missing value: texts as written, or limits such as "&lt;= -999"; null for the usual marks. A blank is always missing.</summary>
    public IReadOnlyList<string>? MissingMarks { get; init; }

    /// <summary>Unit of the values; null to take it from the header or the row of units.</summary>
    public UnitOfMeasure? Unit { get; init; }

    /// <summary>The column of values.</summary>
    public string ValueColumn { get; init; } = "2";

    /// <summary>The column of quality codes; null when there is none.</summary>
    public string? QualityColumn { get; init; }

    /// <summary>The clock of the times.</summary>
    public RecipeClock Clock { get; init; } = RecipeClock.AsWritten;

    /// <summary>A column by which rows are chosen, as in a file of several stations; null for all rows.</summary>
    public string? OnlyColumn { get; init; }

    /// <summary>What stands in that column of the rows to be read.</summary>
    public string? OnlyText { get; init; }
}

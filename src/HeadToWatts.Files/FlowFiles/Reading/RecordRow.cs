using HeadToWatts.FlowRecords.Quality;

namespace HeadToWatts.Files.FlowFiles.Reading;

/// <summary>A row of a record: its date as written, its row in the file, its value in the file's unit, its marks.</summary>
internal readonly record struct RecordRow(WrittenDate Date, int FileRow, double Value, DayMarks Marks);

/// <summary>A row whose day, or instant in ms from the start of 1 January of the year 1, is settled.</summary>
internal readonly record struct PlacedRow(long At, int FileRow, double Value, DayMarks Marks);

/// <summary>What a format says of the record it hands over.</summary>
/// <param name="FormatId">Key of the format.</param>
/// <param name="FormatName">Its name.</param>
/// <param name="UsualOrder">The agency's order of day and month, where no date shows it.</param>
/// <param name="Unit">Unit of the values.</param>
/// <param name="Column">Column of the values.</param>
/// <param name="Description">Station or title.</param>
/// <param name="WithinDays">True when the values are known to be instants, however few.</param>
internal sealed record RecordAbout(string FormatId, string FormatName, DateOrder? UsualOrder, Basis.Units.UnitOfMeasure Unit, string Column, string Description, bool WithinDays = false)
{
    /// <summary>The same after levels have become flows.</summary>
    public RecordAbout AsFlow(FlowFileOptions options) => options.Stage is { } stage
        ? this with { Unit = Basis.Units.UnitTable.CubicMetrePerSecond, Description = Description.Length > 0 ? $"{Description}; {stage.Rating.Describe()}" : stage.Rating.Describe() }
        : this;
}

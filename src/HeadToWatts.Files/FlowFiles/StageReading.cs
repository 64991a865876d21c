using HeadToWatts.FlowRecords.Ratings;

namespace HeadToWatts.Files.FlowFiles;

/// <summary>How water levels become flows while a file is read: every reading by itself, before daily means are taken.</summary>
/// <param name="Rating">The rating.</param>
/// <param name="Outside">What is done with a level the rating does not cover; it is counted in every case.</param>
/// <param name="Shifts">Shifts of the rating.</param>
public sealed record StageReading(StageRating Rating, OutsideRating Outside, StageShifts Shifts);

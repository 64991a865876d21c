using System.Globalization;
using HeadToWatts.Basis.Units;
using HeadToWatts.FlowRecords.Devices;
using HeadToWatts.FlowRecords.Quality;
using HeadToWatts.FlowRecords.Ratings;

namespace HeadToWatts.Files.FlowFiles.Reading;

/// <summary>Turns the values of rows into flows in m3/s: by their unit, or for water levels by a rating, counting what it does not cover.</summary>
internal sealed class RatedRows(RecordRows rows, RecordAbout about, Func<PlacedRow, DateOnly> dayOf, Func<PlacedRow, string> text)
{
    public double FlowM3PerS(PlacedRow row)
    {
        if (rows.Options.Stage is not { } stage)
            return RowOrder.Held(about.Unit, row.Value);
        var level = RowOrder.Held(about.Unit, row.Value) + (stage.Shifts.Shifts.Count == 0 ? 0 : stage.Shifts.OnM(dayOf(row)));
        var rated = stage.Rating.At(level, stage.Outside);
        if (rated.Place is not (RatingPlace.Within or RatingPlace.Missing) && rows.Findings.Count(QualityKind.OutsideRating, Done(stage.Outside)))
            rows.Findings.Example(QualityKind.OutsideRating, row.FileRow, $"{text(row)}, {(rated.Place == RatingPlace.Below ? "below" : "above")} {Level(rated.Place == RatingPlace.Below ? stage.Rating.LowestStageM : stage.Rating.HighestStageM)}");
        return rated.FlowM3PerS;
    }

    public void State()
    {
        if (rows.Options.Stage is not { } stage)
            return;
        rows.Assume($"the levels become flows by a {stage.Rating.Describe()}");
        if (stage.Rating is DeviceRating { Device: { SubmergenceLimitRatio: > 0 } device })
            rows.Assume($"free flow is taken: with the water below at more than {(device.SubmergenceLimitRatio * 100).ToString("0", CultureInfo.InvariantCulture)} % of the head above, the device reads too high");
        else if (stage.Rating is DeviceRating)
            rows.Assume("free flow is taken: with the water below above the crest, the device reads too high");
        foreach (var shift in stage.Shifts.Shifts)
            rows.Assume($"from {shift.From.ToString("yyyy-MM-dd", CultureInfo.InvariantCulture)} on {shift.ShiftM.ToString("0.####", CultureInfo.InvariantCulture)} m is added to the level");
    }

    private static string Done(OutsideRating outside) => outside switch
    {
        OutsideRating.HoldEnd => "given the flow at the end of the rating",
        OutsideRating.Extend => "given the rating carried on beyond its end",
        _ => "left out: no flow is given",
    };

    private string Level(double stageM) => about.Unit.FromHeld(stageM).ToString("0.###", CultureInfo.InvariantCulture) + " " + about.Unit.Symbol;
}

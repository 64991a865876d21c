using System.Globalization;
using HeadToWatts.Basis.Problems;
using HeadToWatts.Basis.Units;
using HeadToWatts.Files.FlowFiles;
using HeadToWatts.FlowRecords.Devices;
using HeadToWatts.FlowRecords.Ratings;

namespace HeadToWatts.Files.StudyFiles;

/// <summary>Builds the rating of a file of water levels, or lists every problem of it.</summary>
public static class RatingBuilder
{
    /// <summary>The kinds that may be chosen: key and name.</summary>
    public static IReadOnlyList<(string Id, string Name)> Kinds { get; } =
        [("table", "Rating table"), ("equation", "Equation Q = C (h − h0)^n"), .. PrimaryDevices.All.Select(d => (d.Id, d.Name))];

    /// <summary>Builds the rating.</summary>
    /// <param name="d">The rating as written.</param>
    /// <param name="path">Field that holds it.</param>
    public static Checked<StageReading> Build(RatingDocument d, string path)
    {
        ArgumentNullException.ThrowIfNull(d);
        ArgumentNullException.ThrowIfNull(path);
        var problems = new List<Problem>();
        var read = new FieldReader(problems);
        var rating = d.Kind?.Trim().ToLowerInvariant() switch
        {
            null or "" => Unknown(d, path, read),
            "table" => Table(d, path, read),
            "equation" => Equation(d, path, read),
            { } kind when PrimaryDevices.Find(kind) is { } device => Device(device, d, path, read),
            _ => Unknown(d, path, read),
        };
        var outside = OutsideRating.LeaveOut;
        switch (d.Outside?.Trim().ToUpperInvariant())
        {
            case null or "" or "LEFT OUT":
                break;
            case "HELD":
                outside = OutsideRating.HoldEnd;
                break;
            case "CARRIED ON":
                outside = OutsideRating.Extend;
                break;
            default:
                read.Refuse(path + ".outside", d.Outside, "this choice is not known", "left out, held, carried on");
                break;
        }

        var shifts = Shifts(d, path, read);
        return problems.Count == 0 ? Checked.Of(new StageReading(rating!, outside, shifts!)) : Checked.Refused<StageReading>(problems);
    }

    private static StageRating? Unknown(RatingDocument d, string path, FieldReader read)
    {
        read.Named<string>(d.Kind, path + ".kind", _ => null, Kinds.Select(k => k.Id));
        return null;
    }

    private static RatingTable? Table(RatingDocument d, string path, FieldReader read)
    {
        var before = read.Problems.Count;
        var rows = new List<RatingRow>();
        for (var i = 0; i < (d.Rows?.Count ?? 0); i++)
        {
            var where = $"{path}.rows[{i}]";
            rows.Add(new RatingRow(read.Quantity(d.Rows![i].Level, Dimension.Length, where + ".level", -1e4, 1e4), read.Quantity(d.Rows[i].Flow, Dimension.Flow, where + ".flow", 0, 20_000)));
        }

        var between = RatingInterpolation.Linear;
        switch (d.Between?.Trim().ToUpperInvariant())
        {
            case null or "" or "LINEAR":
                break;
            case "LOG-LOG":
                between = RatingInterpolation.LogLog;
                break;
            default:
                read.Refuse(path + ".between", d.Between, "this is not known", "linear or log-log");
                break;
        }

        var offset = read.Optional(d.Offset, Dimension.Length, path + ".offset", -1e4, 1e4) ?? 0;
        return read.Problems.Count == before && RatingTable.FromRows(rows, between, offset, path + ".rows").TryGet(read.Problems, out var table) ? table : null;
    }

    private static RatingEquation? Equation(RatingDocument d, string path, FieldReader read)
    {
        var before = read.Problems.Count;
        var coefficient = Needed(d.Coefficient, path + ".coefficient", 1e-6, 1e6, read);
        var exponent = Needed(d.Exponent, path + ".exponent", 0.1, 10, read);
        var zero = read.Quantity(d.ZeroFlow, Dimension.Length, path + ".zeroFlow", -1e4, 1e4);
        var lowest = read.Optional(d.Lowest, Dimension.Length, path + ".lowest", -1e4, 1e4);
        var highest = read.Optional(d.Highest, Dimension.Length, path + ".highest", -1e4, 1e4);
        if (lowest < zero)
            read.Refuse(path + ".lowest", d.Lowest, "the lowest level measured lies below the level of no flow", "a level at or above it");
        if (highest <= (lowest ?? zero))
            read.Refuse(path + ".highest", d.Highest, "the highest level measured does not lie above the lowest", "a higher level");
        return read.Problems.Count == before ? new RatingEquation(coefficient, zero, exponent, lowest, highest) : null;
    }

    private static DeviceRating? Device(DeviceKind kind, RatingDocument d, string path, FieldReader read)
    {
        var before = read.Problems.Count;
        var measures = new DeviceMeasures
        {
            WidthM = read.Optional(d.Width, Dimension.Length, path + ".width", 0.01, 100),
            CrestHeightM = read.Optional(d.CrestHeight, Dimension.Length, path + ".crestHeight", 0.01, 50),
            CrestBreadthM = read.Optional(d.CrestBreadth, Dimension.Length, path + ".crestBreadth", 0.01, 50),
            ApproachWidthM = read.Optional(d.ApproachWidth, Dimension.Length, path + ".approachWidth", 0.01, 100),
            AngleRad = read.Optional(d.Angle, Dimension.Angle, path + ".angle", 0.1, Math.PI),
            Contractions = read.Whole(d.Contractions, path + ".contractions", 0, 2),
            DischargeCoefficient = read.Number(d.DischargeCoefficient, path + ".dischargeCoefficient", 0.1, 2),
        };
        var crest = read.Optional(d.CrestLevel, Dimension.Length, path + ".crestLevel", -1e4, 1e4) ?? 0;
        return read.Problems.Count == before && kind.Make(measures, path).TryGet(read.Problems, out var device) ? new DeviceRating(device, crest) : null;
    }

    private static StageShifts? Shifts(RatingDocument d, string path, FieldReader read)
    {
        var before = read.Problems.Count;
        var shifts = new List<StageShift>();
        for (var i = 0; i < (d.Shifts?.Count ?? 0); i++)
        {
            var where = $"{path}.shifts[{i}]";
            var shift = read.Quantity(d.Shifts![i].Shift, Dimension.Length, where + ".shift", -10, 10);
            if (DateOnly.TryParseExact(d.Shifts[i].From, "yyyy-MM-dd", CultureInfo.InvariantCulture, DateTimeStyles.None, out var from))
                shifts.Add(new StageShift(from, shift));
            else
                read.Refuse(where + ".from", d.Shifts[i].From, "this is not a date", "yyyy-mm-dd");
        }

        return read.Problems.Count == before && StageShifts.Of(shifts, path + ".shifts").TryGet(read.Problems, out var made) ? made : null;
    }

    private static double Needed(string? text, string where, double lowest, double highest, FieldReader read)
    {
        if (string.IsNullOrWhiteSpace(text))
            read.Refuse(where, text, "nothing is entered", "a number");
        return read.Number(text, where, lowest, highest) ?? lowest;
    }
}

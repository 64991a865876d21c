using HeadToWatts.Basis.Units;
using HeadToWatts.EnergyYield;
using HeadToWatts.EnergyYield.Electrical;

namespace HeadToWatts.Files.StudyFiles;

/// <summary>Builds what lies between the shaft and the meter.</summary>
internal static class TrainBuilder
{
    internal static PowerTrain Build(LossesDocument d, string path, FieldReader read)
    {
        double ownRatio = 0, ownKw = 0;
        if (!string.IsNullOrWhiteSpace(d.OwnUse))
        {
            if (d.OwnUse.Contains('%', StringComparison.Ordinal))
                ownRatio = read.Optional(d.OwnUse, Dimension.Ratio, path + ".ownUse", 0, 0.5) ?? 0;
            else
                ownKw = (read.Optional(d.OwnUse, Dimension.Power, path + ".ownUse", 0, 1e7) ?? 0) / 1000;
        }

        var generator = d.GeneratorDetail is { } g ? Generator(g, path + ".generatorDetail", read) : null;
        var transformer = d.TransformerDetail is { } t ? Transformer(t, path + ".transformerDetail", read) : null;
        var line = d.LineDetail is { } l ? Line(l, path + ".lineDetail", read) : null;
        return new PowerTrain(
            read.Assumed(d.Drive, Dimension.Ratio, path + ".drive", 0.3, 1, "100 %", "The efficiency of gear or belt"),
            Ratio(d.Generator, d.GeneratorDetail, "generator", "93 %", "The generator efficiency"),
            Ratio(d.Transformer, d.TransformerDetail, "transformer", "99 %", "The transformer efficiency"),
            Ratio(d.Line, d.LineDetail, "line", "99 %", "The line efficiency"),
            ownRatio,
            ownKw,
            read.Assumed(d.Availability, Dimension.Ratio, path + ".availability", 0.1, 1, "95 %", "The availability"))
        {
            Generator = generator,
            Transformer = transformer,
            Line = line,
            PowerFactor = PowerFactor(d, generator?.Kind, path, read),
        };

        double Ratio(string? text, object? detail, string field, string usual, string what)
        {
            if (detail is null)
                return read.Assumed(text, Dimension.Ratio, $"{path}.{field}", 0.3, 1, usual, what);
            if (!string.IsNullOrWhiteSpace(text))
                read.Refuse($"{path}.{field}", text, "this is given in detail as well", $"either {field} or {field}Detail");
            return 1;
        }
    }

    private static double PowerFactor(LossesDocument d, GeneratorKind? kind, string path, FieldReader read)
    {
        if (read.Number(d.PowerFactor, path + ".powerFactor", 0.3, 1) is { } given)
            return given;
        if (d.TransformerDetail is null && d.LineDetail is null)
            return 1;
        var usual = GeneratorMachine.UsualPowerFactor(kind);
        if (string.IsNullOrWhiteSpace(d.PowerFactor))
            read.Assume(string.Create(System.Globalization.CultureInfo.InvariantCulture, $"The power factor is not given; {usual} is assumed."));
        return usual;
    }

    private static GeneratorMachine Generator(GeneratorDocument d, string path, FieldReader read)
    {
        var kind = d.Kind?.Trim().ToUpperInvariant() switch
        {
            null or "" or "SYNCHRONOUS" => GeneratorKind.Synchronous,
            "INDUCTION" => GeneratorKind.Induction,
            _ => (GeneratorKind?)null,
        };
        if (kind is null)
            read.Refuse(path + ".kind", d.Kind, "this kind of generator is not known", "synchronous, induction");
        return new GeneratorMachine(
            kind ?? GeneratorKind.Synchronous,
            read.Optional(d.Rating, Dimension.Power, path + ".rating", 10, 1e9) / 1000,
            read.Optional(d.Efficiency, Dimension.Ratio, path + ".efficiency", 0.3, 0.995));
    }

    private static TransformerMachine Transformer(TransformerDocument d, string path, FieldReader read)
    {
        var live = d.WhenStanding?.Trim().ToUpperInvariant() switch { null or "" or "LIVE" => true, "OFF" => false, _ => (bool?)null };
        if (live is null)
            read.Refuse(path + ".whenStanding", d.WhenStanding, "say whether it is fed from the grid while the plant stands", "live, off");
        return new TransformerMachine(
            read.Optional(d.Rating, Dimension.ApparentPower, path + ".rating", 100, 1e9) / 1000,
            Loss(d.NoLoadLoss, "noLoadLoss", "0.3 %", "The transformer's no-load loss"),
            Loss(d.LoadLoss, "loadLoss", "1.2 %", "The transformer's load loss"),
            live ?? true);

        RatedLoss Loss(string? text, string field, string usual, string what) =>
            string.IsNullOrWhiteSpace(text) || text.Contains('%', StringComparison.Ordinal)
                ? new RatedLoss(null, read.Assumed(text, Dimension.Ratio, $"{path}.{field}", 0, 0.1, usual, what))
                : new RatedLoss((read.Optional(text, Dimension.Power, $"{path}.{field}", 0, 1e8) ?? 0) / 1000, 0);
    }

    private static LineRun? Line(LineDocument d, string path, FieldReader read)
    {
        var before = read.Problems.Count;
        var length = read.Quantity(d.Length, Dimension.Length, path + ".length", 0, 200_000);
        var voltage = read.Quantity(d.Voltage, Dimension.Voltage, path + ".voltage", 12, 150_000);
        int? phases = d.Phases?.Trim() switch { null or "" or "3" => 3, "1" => 1, _ => null };
        if (phases is null)
            read.Refuse(path + ".phases", d.Phases, "a line has three phases or one", "3, 1");
        var size = read.Named(d.Conductor, path + ".conductor", Conductors.Find, Conductors.Sizes.Select(s => s.Name));
        var metal = string.IsNullOrWhiteSpace(d.Metal) ? Conductors.Aluminium : read.Named(d.Metal, path + ".metal", Conductors.FindMetal, Conductors.Metals.Select(m => m.Name));
        if (string.IsNullOrWhiteSpace(d.Metal))
            read.Assume("The metal of the line is not given; aluminium is assumed.");
        var temperature = read.Assumed(d.Temperature, Dimension.Temperature, path + ".temperature", -40, 100, "50 degC", "The temperature of the line's conductors");
        return read.Problems.Count > before ? null : new LineRun(length, voltage, phases!.Value, size!, metal!, temperature);
    }
}

using HeadToWatts.Basis.Units;
using HeadToWatts.Hydraulics.Friction;
using HeadToWatts.Hydraulics.LocalLosses;
using HeadToWatts.Hydraulics.Pipes;
using HeadToWatts.Hydraulics.Waterways;
using HeadToWatts.Studies.Inputs;

namespace HeadToWatts.Files.StudyFiles;

/// <summary>Builds the waterway of an alternative.</summary>
internal static class WaterwayBuilder
{
    internal static WaterwayInput Build(WaterwayDocument d, string path, FieldReader read)
    {
        var formula = FrictionFormulas.Default;
        if (!string.IsNullOrWhiteSpace(d.Friction))
            formula = read.Named(d.Friction, path + ".friction", FrictionFormulas.Find, FrictionFormulas.All.Select(f => f.Name)) ?? formula;
        var alpha = read.Number(d.KineticEnergyCoefficient, path + ".kineticEnergyCoefficient", 1, 2) ?? 1;
        var elements = d.Elements.Select((e, i) => Element(e, i, $"{path}.elements[{i}]", read)).ToList();
        return new WaterwayInput([.. elements.OfType<PipeElement>()], formula, alpha) { Stop = StopBuilder.Build(d.Stop, path + ".stop", read) };
    }

    private static PipeElement? Element(ElementDocument d, int index, string path, FieldReader read)
    {
        var before = read.Problems.Count;
        var length = read.Quantity(d.Length, Dimension.Length, path + ".length", 0.01, 100_000);
        var diameter = read.Quantity(d.InsideDiameter, Dimension.Length, path + ".insideDiameter", 0.005, 20);
        var material = read.Named(d.Material, path + ".material", PipeMaterials.Find, PipeMaterials.All.Select(m => m.Name));
        var roughness = read.Optional(d.Roughness, Dimension.Length, path + ".roughness", 0, 0.1);
        var c = read.Number(d.HazenWilliamsC, path + ".hazenWilliamsC", 30, 170);
        var n = read.Number(d.ManningN, path + ".manningN", 0.005, 0.05);
        var wall = read.Optional(d.WallThickness, Dimension.Length, path + ".wallThickness", 0.0002, 2);
        var rating = read.Optional(d.PressureRating, Dimension.Pressure, path + ".pressureRating", 1000, 1e8);
        var end = read.Optional(d.EndElevation, Dimension.Length, path + ".endElevation", -430, 9000);
        var fittings = (d.Fittings ?? []).Select((f, i) => ReadFitting(f, $"{path}.fittings[{i}]", read)).ToList();
        if (roughness is { } rough && read.Problems.Count == before && rough / diameter > 0.05)
            read.Refuse(path + ".roughness", d.Roughness, "it is more than 5 % of the diameter", "a wall roughness, such as \"0.05 mm\"");
        if (read.Problems.Count > before || material is null)
            return null;
        return new PipeElement(
            string.IsNullOrWhiteSpace(d.Name) ? $"pipe {index + 1}" : d.Name,
            length,
            diameter,
            material,
            roughness ?? material.RoughnessM,
            c ?? material.HazenWilliamsCoefficient,
            n ?? material.ManningCoefficient,
            [.. fittings.OfType<Fitting>()],
            wall,
            rating,
            end);
    }

    private static Fitting? ReadFitting(FittingDocument d, string path, FieldReader read)
    {
        var before = read.Problems.Count;
        var k = read.Number(d.K, path + ".k", 0, 1000);
        var count = read.Whole(d.Count, path + ".count", 1, 1000) ?? 1;
        var kind = string.IsNullOrWhiteSpace(d.Fitting) ? null : FittingKinds.Find(d.Fitting.Trim());
        if (kind is null && string.IsNullOrWhiteSpace(d.K))
            read.Named(d.Fitting, path + ".fitting", FittingKinds.Find, FittingKinds.All.Select(f => f.Name));
        return read.Problems.Count > before ? null : new Fitting(kind?.Name ?? d.Fitting ?? "local loss", k ?? kind!.LossCoefficient, count, kind);
    }
}

using HeadToWatts.Basis.Units;
using HeadToWatts.Hydraulics.Water;
using HeadToWatts.Pumping;
using HeadToWatts.Studies.Inputs;

namespace HeadToWatts.Files.StudyFiles;

/// <summary>Builds the pumping of an alternative.</summary>
internal static class PumpingBuilder
{
    internal static PumpingInput? Build(PumpingDocument? d, string path, SiteInput place, FieldReader read)
    {
        if (d is null)
            return null;
        if (d.Plants.Count == 0)
        {
            read.Refuse(path + ".plants", "", "no plant is given", "one or more plants, or no pumping at all");
            return null;
        }

        var before = read.Problems.Count;
        var site = SiteConditions.At(place.LatitudeRad, place.ElevationM, place.WaterTemperatureDegC);
        var plants = d.Plants.Select((p, i) => Plant(p, i, $"{path}.plants[{i}]", site, read)).ToList();
        return read.Problems.Count > before ? null : new PumpingInput([.. plants.Select(p => p!)]);
    }

    private static PumpingPlantInput? Plant(PumpingPlantDocument d, int index, string path, SiteConditions site, FieldReader read)
    {
        var before = read.Problems.Count;
        var source = string.IsNullOrWhiteSpace(d.Energy) ? EnergySources.All[0] : read.Named(d.Energy, path + ".energy", EnergySources.Find, EnergySources.All.Select(s => s.Id));
        var flow = read.Quantity(d.Flow, Dimension.Flow, path + ".flow", 1e-5, 200);
        var volumes = Volumes(d, path, flow, read);
        var head = Head(d, path, flow, site, read);
        if (read.Problems.Count > before)
            return null;
        if (Efficiency(d, path, source!, flow, head!.TotalM, site, read) is not { } efficiency)
            return null;
        var price = read.Number(d.Price, path + ".price", 0, 1e6);
        var lift = read.Optional(d.SuctionLift, Dimension.Length, path + ".suctionLift", -200, 15);
        var loss = read.Optional(d.SuctionLoss, Dimension.Length, path + ".suctionLoss", 0, 50) ?? 0;
        var required = read.Optional(d.RequiredSuctionHead, Dimension.Length, path + ".requiredSuctionHead", 0, 30);
        var name = string.IsNullOrWhiteSpace(d.Name) ? $"pump {index + 1}" : d.Name.Trim();
        return read.Problems.Count > before ? null : new PumpingPlantInput(new PumpingPlant(name, source!, flow, volumes!, head, efficiency, price), lift, loss, required);
    }

    private static List<double>? Volumes(PumpingPlantDocument d, string path, double flowM3PerS, FieldReader read)
    {
        var byVolume = d.VolumeByMonth is { Count: > 0 };
        if (byVolume == d.HoursByMonth is { Count: > 0 })
        {
            read.Refuse(path + ".volumeByMonth", "", byVolume ? "volumes and hours are both given" : "nothing is entered", "twelve volumes, or twelve running times in hoursByMonth");
            return null;
        }

        var texts = byVolume ? d.VolumeByMonth! : d.HoursByMonth!;
        var field = byVolume ? ".volumeByMonth" : ".hoursByMonth";
        if (texts.Count != 12)
        {
            read.Refuse(path + field, $"{texts.Count} figures", "twelve are wanted, January first");
            return null;
        }

        return [.. texts.Select((t, i) => byVolume
            ? read.Quantity(t, Dimension.Volume, $"{path}{field}[{i}]", 0, 1e9)
            : read.Quantity(t, Dimension.Duration, $"{path}{field}[{i}]", 0, 31 * 86_400.0) * flowM3PerS)];
    }

    private static PumpingHead? Head(PumpingPlantDocument d, string path, double flowM3PerS, SiteConditions site, FieldReader read)
    {
        var before = read.Problems.Count;
        var parts = new[] { d.Lift, d.Drawdown, d.Pressure }.Any(t => !string.IsNullOrWhiteSpace(t)) || d.Pipe is not null;
        if (!string.IsNullOrWhiteSpace(d.TotalHead))
        {
            if (parts)
                read.Refuse(path + ".totalHead", d.TotalHead, "the total head and its parts are both given", "one of the two");
            var total = read.Quantity(d.TotalHead, Dimension.Length, path + ".totalHead", 0.1, 2000);
            return read.Problems.Count > before ? null : new PumpingHead(total, 0, 0, 0);
        }

        if (!parts)
        {
            read.Refuse(path + ".lift", "", "nothing is entered", "lift, drawdown, pressure and pipe, or totalHead");
            return null;
        }

        var lift = read.Optional(d.Lift, Dimension.Length, path + ".lift", -50, 2000) ?? 0;
        var drawdown = read.Optional(d.Drawdown, Dimension.Length, path + ".drawdown", 0, 500) ?? 0;
        var pressure = read.Optional(d.Pressure, Dimension.Pressure, path + ".pressure", 0, 5e6) ?? 0;
        var loss = d.Pipe is null ? 0 : WaterwayBuilder.Build(d.Pipe, path + ".pipe", read) is var pipe && read.Problems.Count == before ? pipe.Build().At(flowM3PerS, site).TotalLossM : 0;
        var head = new PumpingHead(lift, drawdown, pressure / site.SpecificWeightNPerM3, loss);
        if (read.Problems.Count == before && head.TotalM < 0.1)
            read.Refuse(path + ".lift", d.Lift, "the head adds up to nothing", "a head above 0.1 m");
        return read.Problems.Count > before ? null : head;
    }

    private static double? Efficiency(PumpingPlantDocument d, string path, EnergySource source, double flowM3PerS, double headM, SiteConditions site, FieldReader read)
    {
        var before = read.Problems.Count;
        var waterKw = site.SpecificWeightNPerM3 * flowM3PerS * headM / 1000;
        var test = source.IsElectric ? d.TestPower : d.TestFuelPerHour;
        if (!string.IsNullOrWhiteSpace(d.Efficiency) && !string.IsNullOrWhiteSpace(test))
            read.Refuse(path + ".efficiency", d.Efficiency, "an efficiency and a pump test are both given", "one of the two");
        double? efficiency;
        if (!string.IsNullOrWhiteSpace(test))
        {
            efficiency = source.IsElectric
                ? waterKw * 1000 / read.Quantity(d.TestPower, Dimension.Power, path + ".testPower", 10, 1e8)
                : waterKw / source.WaterKwhPerUnit / (read.Number(d.TestFuelPerHour, path + ".testFuelPerHour", 1e-3, 1e4) ?? double.NaN);
            if (read.Problems.Count == before && !(efficiency is > 0.02 and < 1.3))
                read.Refuse(path + (source.IsElectric ? ".testPower" : ".testFuelPerHour"), test, $"the test gives an efficiency of {UnitDisplay.Percent(efficiency.Value)}", "flow, head and power of one and the same test");
        }
        else
        {
            efficiency = read.Assumed(d.Efficiency, Dimension.Ratio, path + ".efficiency", 0.02, 1.3, source.IsElectric ? "66 %" : "100 %", source.IsElectric ? "The efficiency of a pumping plant" : "The rating of an engine-driven pumping plant");
        }

        return read.Problems.Count > before ? null : efficiency;
    }
}

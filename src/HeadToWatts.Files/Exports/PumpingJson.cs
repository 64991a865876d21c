using System.Text.Json;
using HeadToWatts.Studies;

namespace HeadToWatts.Files.Exports;

/// <summary>Pumping beside generation as JSON.</summary>
internal static class PumpingJson
{
    internal static void Write(Utf8JsonWriter json, StudyResult r)
    {
        if (r.Pumping is not { } side)
        {
            json.WriteNull("pumping");
            return;
        }

        json.WriteStartObject("pumping");
        json.WriteNumber("electricKwh", side.Pumping.ElectricKwh);
        if (side.CoveredInTheMonthKwh is { } covered)
            json.WriteNumber("coveredInTheMonthKwh", covered);
        else
            json.WriteNull("coveredInTheMonthKwh");
        json.WriteStartArray("electricByMonthKwh");
        foreach (var kwh in side.Pumping.ElectricByMonthKwh)
            json.WriteNumberValue(kwh);
        json.WriteEndArray();
        json.WriteStartArray("plants");
        for (var i = 0; i < side.Pumping.Plants.Count; i++)
        {
            var p = side.Pumping.Plants[i];
            json.WriteStartObject();
            json.WriteString("name", p.Plant.Name);
            json.WriteString("energy", p.Plant.Source.Id);
            json.WriteString("unit", p.Plant.Source.Unit);
            json.WriteNumber("volumeM3", p.Plant.AnnualVolumeM3);
            json.WriteNumber("headM", p.Plant.Head.TotalM);
            json.WriteNumber("pipeLossM", p.Plant.Head.PipeLossM);
            json.WriteNumber("efficiency", p.Plant.PlantEfficiency);
            json.WriteNumber("ratingRatio", p.RatingRatio);
            json.WriteNumber("unitsPerYear", p.AnnualUnits);
            json.WriteNumber("achievableUnits", p.AchievableUnits);
            json.WriteNumber("demandKw", p.DemandKw);
            if (side.SuctionAvailableM[i] is { } suction)
                json.WriteNumber("suctionHeadM", suction);
            else
                json.WriteNull("suctionHeadM");
            json.WriteEndObject();
        }

        json.WriteEndArray();
        json.WriteEndObject();
    }
}

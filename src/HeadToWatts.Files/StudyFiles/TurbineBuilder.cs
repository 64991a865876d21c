using HeadToWatts.Basis.Units;
using HeadToWatts.Studies.Inputs;
using HeadToWatts.Turbines;
using HeadToWatts.Turbines.Sizing;

namespace HeadToWatts.Files.StudyFiles;

/// <summary>Builds the turbine of an alternative.</summary>
internal static class TurbineBuilder
{
    private static PumpPoint Pump(PumpDocument d, string path, FieldReader read) => new(
        read.Quantity(d.Flow, Dimension.Flow, path + ".flow", 1e-5, 20),
        read.Quantity(d.Head, Dimension.Length, path + ".head", 0.5, 2000),
        read.Quantity(d.Efficiency, Dimension.Ratio, path + ".efficiency", 0.2, 0.95),
        read.Quantity(d.Speed, Dimension.RotationalSpeed, path + ".speed", 50, 6000));

    internal static TurbineInput Build(TurbineDocument d, string path, FieldReader read)
    {
        var type = FlowBuilder.IsSuggest(d.Type) ? null : read.Named(d.Type, path + ".type", TurbineTypes.Find, TurbineTypes.All.Select(t => t.Name).Prepend("suggest"));
        int? units = FlowBuilder.IsSuggest(d.Units) ? null : read.Whole(d.Units, path + ".units", 1, 12);
        var least = read.Optional(d.LeastFlow, Dimension.Ratio, path + ".leastFlow", 0, 1);
        EfficiencyCurve? curve = null;
        if (d.EfficiencyTable is { Count: > 0 } table)
        {
            if (type is null)
                read.Refuse(path + ".type", d.Type, "a manufacturer's table belongs to one type; name it", string.Join(", ", TurbineTypes.All.Select(t => t.Name)));
            var before = read.Problems.Count;
            var rows = table.Select((r, i) => (
                read.Quantity(r.Flow, Dimension.Ratio, $"{path}.efficiencyTable[{i}].flow", 0, 1.5),
                read.Quantity(r.Efficiency, Dimension.Ratio, $"{path}.efficiencyTable[{i}].efficiency", 0, 1))).ToList();
            if (read.Problems.Count == before && EfficiencyCurve.FromTable(rows, path + ".efficiencyTable").TryGet(read.Problems, out var made))
                curve = made;
        }

        return new TurbineInput(type, units, curve, least)
        {
            UnitSizes = MachineBuilder.UnitSizes(d, type, path, read),
            Split = MachineBuilder.Split(d, path, read),
            HillChart = MachineBuilder.HillChart(d, type, path, read),
            TestedDiameterM = MachineBuilder.TestedDiameterM(d, type, path, read),
            RunnerDiameterM = read.Optional(d.RunnerDiameter, Dimension.Length, path + ".runnerDiameter", 0.02, 15),
            FollowsHead = MachineBuilder.FollowsHead(d, path, read),
            LeastHeadRatio = MachineBuilder.IsShare(d.LeastHead) ? read.Optional(d.LeastHead, Dimension.Ratio, path + ".leastHead", 0.1, 1) : null,
            LeastHeadM = MachineBuilder.IsShare(d.LeastHead) ? null : read.Optional(d.LeastHead, Dimension.Length, path + ".leastHead", 0, 2000),
            RunnerHeightM = read.Optional(d.RunnerHeight, Dimension.Length, path + ".runnerHeight", -30, 30),
            Pump = d.Pump is { } pump ? Pump(pump, path + ".pump", read) : null,
        };
    }
}

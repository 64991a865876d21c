using HeadToWatts.Files.FlowFiles.CurveCsv;
using HeadToWatts.Files.FlowFiles.DailyCsv;
using HeadToWatts.Files.FlowFiles.FranceJson;
using HeadToWatts.Files.FlowFiles.Grdc;
using HeadToWatts.Files.FlowFiles.Nrfa;
using HeadToWatts.Files.FlowFiles.Reclamation;
using HeadToWatts.Files.FlowFiles.UsgsRdb;
using HeadToWatts.Files.FlowFiles.WaterSurveyCanada;

namespace HeadToWatts.Files.FlowFiles;

/// <summary>The kinds of flow file that are read. A file is tried against them in this order, the particular before the general.</summary>
public static class FlowFileFormats
{
    /// <summary>All of them.</summary>
    public static IReadOnlyList<IFlowFileFormat> All { get; } =
    [
        new UsgsRdbFormat(),
        new WaterSurveyCanadaFormat(),
        new NrfaFormat(),
        new GrdcFormat(),
        new FranceJsonFormat(),
        new ReclamationFormat(),
        new CurveCsvFormat(),
        new DailyCsvFormat(),
    ];

    /// <summary>Finds a format by its key; null when there is none.</summary>
    public static IFlowFileFormat? Find(string id) =>
        All.FirstOrDefault(f => string.Equals(f.Id, id, StringComparison.OrdinalIgnoreCase));
}

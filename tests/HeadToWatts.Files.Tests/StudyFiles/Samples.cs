using HeadToWatts.Files.StudyFiles;
using HeadToWatts.Studies.Inputs;

namespace HeadToWatts.Files.Tests.StudyFiles;

internal static class Samples
{
    /// <summary>A whole study in one small text, changed by the tests one field at a time.</summary>
    internal const string Good = """
        {
          "format": 1,
          "name": "Sample",
          "units": "US",
          "alternatives": [
            {
              "name": "only",
              "site": { "latitude": "44 deg", "elevation": "2000 ft", "waterTemperature": "50 degF", "gridFrequency": "60 Hz" },
              "flow": {
                "curve": [
                  { "exceeded": "10 %", "flow": "40 cfs" },
                  { "exceeded": "50 %", "flow": "20 cfs" },
                  { "exceeded": "95 %", "flow": "5 cfs" }
                ],
                "reservedFlow": "2 cfs",
                "designFlow": "22 cfs"
              },
              "head": { "gross": "60 ft" },
              "waterway": {
                "elements": [
                  {
                    "name": "pipe",
                    "length": "300 ft",
                    "insideDiameter": "24 in",
                    "material": "PVC",
                    "fittings": [ { "fitting": "Entrance, rounded" }, { "fitting": "our own screen", "k": 0.4, "count": 2 } ]
                  }
                ]
              },
              "turbine": { "type": "suggest", "units": "suggest" },
              "losses": { "drive": "98 %", "generator": "92 %", "transformer": "99 %", "line": "99 %", "ownUse": "1 %", "availability": "95 %" }
            }
          ]
        }
        """;

    internal static string With(string old, string replacement)
    {
        Assert.Contains(old, Good, StringComparison.Ordinal);
        return Good.Replace(old, replacement, StringComparison.Ordinal);
    }

    internal static StudyInput Input(string text) => StudyBuilder.Build(StudyFileReader.Parse("sample.json", text).Value, NoFlowFiles.Instance).Value;

    /// <summary>The problems of a text, whether it fails to be read or to be built.</summary>
    internal static IReadOnlyList<HeadToWatts.Basis.Problems.Problem> Problems(string text)
    {
        var document = StudyFileReader.Parse("sample.json", text);
        return document.IsGood ? StudyBuilder.Build(document.Value, NoFlowFiles.Instance).Problems : document.Problems;
    }
}

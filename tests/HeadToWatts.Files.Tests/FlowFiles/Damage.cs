using HeadToWatts.Basis.Problems;
using HeadToWatts.Files.FlowFiles;

namespace HeadToWatts.Files.Tests.FlowFiles;

internal static class Damage
{
    /// <summary>Read whole, or refused with problems that can be acted on.</summary>
    public static void Survives(Checked<FlowFile> read)
    {
        if (read.IsGood)
        {
            Assert.True(read.Value.Record is not null ^ read.Value.Curve is not null);
            Assert.NotEmpty(read.Value.Report.Lines());
        }
        else
        {
            Assert.InRange(read.Problems.Count, 1, 51);
            Assert.All(read.Problems, p => Assert.True(p.Where.Length > 0 && p.Why.Length > 0));
        }
    }
}

using HeadToWatts.Basis.Units;
using HeadToWatts.Files.StudyFiles;
using HeadToWatts.Memos.Tests.Pdf;

namespace HeadToWatts.Memos.Tests.Sections;

/// <summary>What the memo says of machines given in detail.</summary>
public class MachinePartTests
{
    [Fact]
    public void Machines_behind_the_shaft_stand_in_the_memo_with_their_powers()
    {
        var result = Studies.Changed("larkspur-drop", study =>
        {
            var losses = study.Alternatives[0].Losses;
            (losses.Generator, losses.Transformer, losses.Line) = (null, null, null);
            losses.GeneratorDetail = new GeneratorDocument { Kind = "induction" };
            losses.TransformerDetail = new TransformerDocument { Rating = "225 kVA" };
            losses.LineDetail = new LineDocument { Length = "2 mi", Voltage = "12.47 kV", Conductor = "1/0 AWG" };
        });
        using var read = new ReadBack(Memo.Make(result, result.Show()));
        var text = string.Join("\n", read.PageTexts);
        Assert.Contains("From the shaft to the meter", text, StringComparison.Ordinal);
        Assert.Contains("225 kVA", text, StringComparison.Ordinal);
        Assert.Contains("1/0 AWG aluminium", text, StringComparison.Ordinal);
        Assert.Contains("transformer while standing", text, StringComparison.Ordinal);
        Assert.Contains(UnitDisplay.Power(result.Energy.Electrical!.AtBest.GeneratedKw).Replace(' ', ' '), text.Replace('\u00a0', ' '), StringComparison.Ordinal);
    }
}

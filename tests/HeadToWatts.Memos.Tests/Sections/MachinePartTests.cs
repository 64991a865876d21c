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

    [Fact]
    public void Machines_side_by_side_units_that_share_and_a_machine_that_follows_the_head_stand_in_the_memo()
    {
        var result = Studies.Changed("larkspur-drop", study =>
        {
            var turbine = study.Alternatives[0].Turbine;
            turbine.Type = "kaplan";
            turbine.Units = null;
            turbine.UnitSizes = [new UnitDocument { Share = "35 %" }, new UnitDocument { Share = "65 %", LeastFlow = "25 %" }];
            turbine.LoadSplit = "best";
            turbine.AwayFromRatedHead = "follow";
            turbine.RunnerHeight = "2 ft";
        });
        using var read = new ReadBack(Memo.Make(result, result.Show()));
        var text = string.Join("\n", read.PageTexts);
        foreach (var words in new[] { "Size, speed and setting", "Sharing the flow among the units", "Away from its rated head", "for most power at each flow", "Runner above the lowest tailwater", "three points lower" })
            Assert.Contains(words, text, StringComparison.Ordinal);
        Assert.All(result.Turbine.Sheets, s => Assert.Contains(s.Candidate.Type.Name, text, StringComparison.OrdinalIgnoreCase));
    }

    [Fact]
    public void A_pump_as_turbine_stands_in_the_memo_as_a_band()
    {
        var result = Studies.Changed("tamarack-pipeline", study =>
        {
            study.Alternatives[0].Turbine.Type = "pump as turbine";
            study.Alternatives[0].Turbine.Pump = new PumpDocument { Flow = "2 cfs", Head = "100 ft", Efficiency = "80 %", Speed = "1750 rpm" };
        });
        using var read = new ReadBack(Memo.Make(result, result.Show()));
        var text = string.Join("\n", read.PageTexts);
        Assert.Contains("Pump as turbine", text, StringComparison.Ordinal);
        Assert.All(result.Turbine.Pump!.Estimates, e => Assert.Contains(e.Correlation.Name, text, StringComparison.Ordinal));
    }
}

using HeadToWatts.Basis.Units;
using HeadToWatts.Memos.Content;

namespace HeadToWatts.Memos.Sections;

/// <summary>The site and the section through the scheme.</summary>
internal static class SiteSection
{
    public static void Write(MemoContext memo)
    {
        var body = memo.Body;
        var result = memo.Result;
        var show = memo.Show;
        var input = result.Input;
        body.Section("Site and scheme", "site");
        var pipes = input.Waterway.Elements;
        var fall = input.Head.IsFromLevels
            ? (input.Head.Moves ? "At the design flow the" : "The") + $" headwater stands at {memo.Level(result.Head.HeadwaterM)} and the tailwater at {memo.Level(result.Head.TailwaterM)}: a gross head of {show.Length(result.Head.GrossHeadM)}."
            : $"The gross head{(input.Head.Measurement.Length > 0 ? "" : ", given as such,")} is {show.Length(result.Head.GrossHeadM)}.";
        if (input.Head.Measurement.Length > 0)
            fall += " It comes from a measurement: " + MemoContext.Sentence(input.Head.Measurement);
        if (input.Head.ErrorM > 0)
            fall += $" Its error is given as {show.Length(input.Head.ErrorM)} either way.";
        var way = pipes.Count == 0
            ? "The machine stands at the drop, without a pipe before it."
            : pipes.Count == 1
                ? $"{MemoContext.Capital(pipes[0].Name)}, {show.Length(pipes[0].LengthM)} of {Named(pipes[0].Material.Name)} with an inside diameter of {show.Diameter(pipes[0].InsideDiameterM)}, leads to the machine."
                : $"{MemoContext.Count(pipes.Count)} pipe elements, {show.Length(pipes.Sum(p => p.LengthM))} together, lead to the machine.";
        body.Say(fall + " " + way + $" At the design flow of {show.Flow(result.Flow.DesignFlowM3PerS)} the losses leave {show.Length(result.Head.NetHeadAtDesignM)} net. " + RichText.See("fig-section") + " shows the scheme to scale in height, with the energy and hydraulic grade lines.");
        body.Figure("fig-section", Figures.Section(memo), "Section through the scheme at the design flow, with water levels, pipe, machine, energy and hydraulic grade lines and the heads.");
        if (!string.IsNullOrWhiteSpace(result.Header.Notes))
            body.Say(RichText.Bold("Remarks of the author. ") + result.Header.Notes.Trim());
        body.Say("Ownership of the structures, land and water was not examined.", ParagraphKind.Note);
    }

    private static string Named(string material) => material.Length > 1 && char.IsUpper(material[1]) ? material : char.ToLowerInvariant(material[0]) + material[1..];
}

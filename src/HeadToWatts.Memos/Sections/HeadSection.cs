using HeadToWatts.Basis.Units;
using HeadToWatts.Hydraulics.Surge;
using HeadToWatts.Hydraulics.Waterways;
using HeadToWatts.Memos.Content;

namespace HeadToWatts.Memos.Sections;

/// <summary>Head, losses, velocities and pressures.</summary>
internal static class HeadSection
{
    public static void Write(MemoContext memo)
    {
        var body = memo.Body;
        var result = memo.Result;
        var show = memo.Show;
        body.Section("Head and losses", "head");
        var losses = result.Waterway.AtDesign;
        body.Say($"Of {show.Length(result.Head.GrossHeadM)} gross head, {show.Length(losses.TotalLossM)} ({MemoContext.Percent(result.Waterway.LossShareOfGrossHead)}) is lost at the design flow. The loss falls with the flow, so every flow has its own net head (" + RichText.See("tab-net-head") + "); that is what the energy is reckoned with. " + (result.Input.Head.Moves
            ? "The water levels move, and the energy follows them; " + RichText.See("tab-levels") + " shows how."
            : "The two water levels are held constant; if the tailwater rises with the flow, head is lost that is not in these figures."));
        NetHeads(memo);
        Levels(memo);
        if (Figures.Levels(memo) is { } levels)
            body.Figure("fig-levels", levels, "Water levels against the flow passing, and the net head that is left; where it is none the plant stands.");
        if (losses.Elements.Count == 0)
        {
            body.Say("There is no waterway before the machine in this study: intake, rack and draft tube are taken to be part of it, without a loss of their own.");
            return;
        }

        var formula = result.Input.Waterway.Formula;
        body.Say(RichText.Of($"Friction is by {formula.Name} ") + body.Cite(formula.Method.Source, formula.Method.Locator) + ", fittings by their loss coefficients K. " + RichText.See("tab-losses") + " shows each.");
        Losses(memo, losses);
        if (losses.Elements.Sum(e => 1 + e.Fittings.Count) > 1 && Figures.Losses(memo) is { } drawing)
            body.Figure("fig-losses", drawing, "Head lost in each element and fitting at the design flow.");
        Velocities(memo, losses);
        if (result.Waterway.Surge is { } surge)
            Pressures(memo, surge);
        StopPart.Write(memo);
    }

    private static void NetHeads(MemoContext memo) => memo.Body.Table("tab-net-head", "Net head at shares of the design flow.",
        [
            new("Share of design flow, %", ColumnAlign.Right),
            new(MemoContext.Head("Flow", memo.Show.FlowUnit), ColumnAlign.Right),
            new(MemoContext.Head("Loss", memo.Show.LengthUnit), ColumnAlign.Right),
            new(MemoContext.Head("Net head", memo.Show.LengthUnit), ColumnAlign.Right),
            new("Net of gross, %", ColumnAlign.Right),
        ],
        [.. memo.Result.Head.AtShares.Select(p => new TableRow([MemoContext.WholePercent(p.ShareOfDesignFlow), memo.Flow(p.FlowM3PerS), memo.Length(p.LossM), memo.Length(p.NetHeadM), Share(p.NetHeadM, p.NetHeadM + p.LossM)]))]);

    private static void Levels(MemoContext memo)
    {
        var levels = memo.Result.Head.Levels;
        if (!memo.Result.Input.Head.Moves)
            return;
        var unit = memo.Show.LengthUnit;
        memo.Body.Table("tab-levels", "Water levels where they move, highest flow first.",
            [
                new(MemoContext.Head("Flow passing", memo.Show.FlowUnit), ColumnAlign.Right), new(MemoContext.Head("Headwater", unit), ColumnAlign.Right),
                new(MemoContext.Head("Tailwater", unit), ColumnAlign.Right), new(MemoContext.Head("Gross head", unit), ColumnAlign.Right), new("Remark", Share: 2),
            ],
            [.. levels.Select(l => new TableRow([memo.Flow(l.PassingFlowM3PerS), memo.LevelNumber(l.HeadwaterM), memo.LevelNumber(l.TailwaterM), memo.Length(l.GrossHeadM), l.IsOutsideRating ? "outside the level rating; held at its end" : ""]))],
            memo.Result.Input.Head.MovesWithMonth ? "Levels that go by the month are those of the middle month of the season." : "");
    }

    private static string Share(double part, double whole) => whole > 0 ? MemoContext.PercentColumn(part / whole) : "–";

    private static void Losses(MemoContext memo, WaterwayLosses losses)
    {
        var show = memo.Show;
        var gross = memo.Result.Head.GrossHeadM;
        var rows = new List<TableRow>();
        foreach (var element in losses.Elements)
        {
            var pipe = element.Element;
            rows.Add(new TableRow([
                pipe.Name,
                $"friction, {show.Length(pipe.LengthM)} of {show.Diameter(pipe.InsideDiameterM)}, {pipe.Material.Name}",
                memo.Length(element.FrictionLossM), MemoContext.PercentColumn(element.FrictionLossM / gross)]));
            foreach (var fitting in element.Fittings)
            {
                var count = fitting.Fitting.Count > 1 ? $"{fitting.Fitting.Count} × " : "";
                RichText cite = fitting.Fitting.Kind is { } kind ? RichText.Of(" ") + memo.Body.Cite(kind.Source) : RichText.Of(", as given");
                rows.Add(new TableRow([pipe.Name, RichText.Of($"{count}{fitting.Fitting.Name}, K = {UnitDisplay.Number(fitting.Fitting.LossCoefficient)}") + cite, memo.Length(fitting.LossM), MemoContext.PercentColumn(fitting.LossM / gross)]));
            }
        }

        rows.Add(new TableRow(["All", "", memo.Length(losses.TotalLossM), MemoContext.PercentColumn(losses.TotalLossM / gross)], RowKind.Total));
        memo.Body.Table("tab-losses", "Head lost at the design flow, by element and fitting.",
            [new("Element"), new("Loss", Share: 3), new(MemoContext.Head("Head lost", show.LengthUnit), ColumnAlign.Right, 0.5), new("Of gross head, %", ColumnAlign.Right, 0.5)], rows);
    }

    private static void Velocities(MemoContext memo, WaterwayLosses losses)
    {
        var limit = memo.Result.Waterway.VelocityLimitMPerS;
        memo.Body.Table("tab-velocity", RichText.Of("Velocity at the design flow against the usual range of the material and the limit ") + RichText.Formula("V_{max}") + " " + memo.Body.Cite(VelocityLimits.Method.Source, VelocityLimits.Method.Locator) + ".",
            [
                new("Element"), new(MemoContext.Head("Velocity", memo.Show.VelocityUnit), ColumnAlign.Right),
                new(MemoContext.Head("Usual", memo.Show.VelocityUnit), ColumnAlign.Right), new(RichText.Formula("V_{max}", bold: true) + RichText.Bold(", " + memo.Show.VelocityUnit.Symbol), ColumnAlign.Right),
                new(RichText.Formula("Re", bold: true), ColumnAlign.Right), new("Finding", Share: 2),
            ],
            [.. losses.Elements.Select(e =>
            {
                var material = e.Element.Material;
                var finding = e.VelocityMPerS > limit ? "above the limit" : e.VelocityMPerS > material.UsualVelocityHighMPerS ? "above the usual range" : e.VelocityMPerS < material.UsualVelocityLowMPerS ? "below the usual range" : "within the usual range";
                return new TableRow([e.Element.Name, memo.Velocity(e.VelocityMPerS), $"{memo.Velocity(material.UsualVelocityLowMPerS)} to {memo.Velocity(material.UsualVelocityHighMPerS)}", memo.Velocity(limit), UnitDisplay.Number(e.Reynolds), finding]);
            })]);
    }

    private static void Pressures(MemoContext memo, SurgeResult surge)
    {
        var show = memo.Show;
        memo.Body.Table("tab-pressure", $"Pressures with a sudden stop: a screening{(surge.ClosureTimeS is null ? " for an instant stop" : "")}, gauge.",
            [
                new("Element"), new(MemoContext.Head("Standing", show.PressureUnit), ColumnAlign.Right), new(MemoContext.Head("Rise", show.PressureUnit), ColumnAlign.Right),
                new(MemoContext.Head("Together", show.PressureUnit), ColumnAlign.Right), new(MemoContext.Head("Pipe's rating", show.PressureUnit), ColumnAlign.Right), new("Wall", Share: 2),
            ],
            [.. surge.Elements.Select(e => new TableRow([
                e.Element.Name,
                UnitDisplay.In(e.StaticPressurePa, show.PressureUnit),
                UnitDisplay.In(e.TotalPressurePa - e.StaticPressurePa, show.PressureUnit),
                UnitDisplay.In(e.TotalPressurePa, show.PressureUnit),
                e.Element.PressureRatingPa is { } rating ? UnitDisplay.In(rating, show.PressureUnit) : "not given",
                e.ThicknessAssumed ? $"not given; D/e = {UnitDisplay.Number(e.DiameterThicknessRatio)} assumed" : $"D/e = {UnitDisplay.Number(e.DiameterThicknessRatio)}",
            ]))],
            $"The pressure wave needs {UnitDisplay.Number(surge.CriticalTimeS)} s to the intake and back. An engineer's transient study decides on pipe class, closing times and vents.");
    }
}

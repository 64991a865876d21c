using System.Globalization;
using System.Text.RegularExpressions;
using HeadToWatts.Basis.Quantities;
using HeadToWatts.Basis.Units;
using HeadToWatts.Economics.CashFlows;
using HeadToWatts.Economics.Costs;
using HeadToWatts.Studies.Inputs;

namespace HeadToWatts.Files.StudyFiles;

/// <summary>Builds what is entered of money.</summary>
internal static partial class MoneyBuilder
{
    private const double Most = 1e12;

    internal static MoneyInput? Build(MoneyDocument? d, string path, FieldReader read)
    {
        if (d is null)
            return null;
        var before = read.Problems.Count;
        var basis = Basis(d, path, read) ?? MoneyBasis.Of("XXX", 2000);
        PriceTerms? terms = d.Terms?.Trim().ToUpperInvariant() switch { null or "" or "REAL" => PriceTerms.Real, "NOMINAL" => PriceTerms.Nominal, _ => null };
        if (terms is null)
            read.Refuse(path + ".terms", d.Terms, "say whether rates are above inflation or include it", "real, nominal");
        if (string.IsNullOrWhiteSpace(d.Terms))
            read.Assume("Real or nominal is not stated; money is counted in real terms, at the prices of the price year.");
        var discount = read.Quantity(d.DiscountRate, Dimension.Ratio, path + ".discountRate", -0.05, 0.5);
        var inflation = read.Optional(d.Inflation, Dimension.Ratio, path + ".inflation", -0.05, 0.5);
        if (inflation is null && terms == PriceTerms.Nominal)
            read.Refuse(path + ".inflation", d.Inflation, "nominal terms need the inflation that later prices follow", "a percent such as 2.5 %");
        if (inflation is null && terms == PriceTerms.Real && (d.Loan is not null || d.Tax is not null))
            read.Refuse(path + ".inflation", d.Inflation, "a loan or a tax fixes sums in the money of later years, so real terms need the inflation between", "a percent such as 2.5 %");
        var life = read.Whole(d.Life, path + ".life", 1, 100);
        if (string.IsNullOrWhiteSpace(d.Life))
            read.Assume("The years of operation are not given; 30 are assumed.");
        var usual = terms == PriceTerms.Nominal ? inflation ?? 0 : 0;
        var contingency = read.Optional(d.Contingency, Dimension.Ratio, path + ".contingency", 0, 2) ?? 0;
        var lines = Each(d.Costs, path + ".costs", (c, at) => Line(c, contingency, basis, at, read));
        var years = read.Whole(d.ConstructionYears, path + ".constructionYears", 0, 20) ?? 0;
        var interest = read.Optional(d.ConstructionInterest, Dimension.Ratio, path + ".constructionInterest", 0, 0.5);
        if (years > 0 && interest is null)
            read.Refuse(path + ".constructionInterest", d.ConstructionInterest, "construction over some years needs the interest on what is spent", "a percent; 0 % for none");
        var input = new MoneyInput(basis, terms ?? PriceTerms.Real, life ?? 30, discount)
        {
            InflationRate = inflation,
            PriceAmountPerKwh = AmountText.Read(d.Price, basis, path + ".price", 0, 100_000, read),
            PriceEscalationRate = Escalation(d.PriceEscalation, path + ".priceEscalation", usual, read),
            DegradationRate = read.Optional(d.Degradation, Dimension.Ratio, path + ".degradation", 0, 0.2) ?? 0,
            CostLines = lines,
            EngineeringRatio = read.Optional(d.Engineering, Dimension.Ratio, path + ".engineering", 0, 1) ?? 0,
            Construction = new Construction(years, interest ?? 0),
            RunningCosts = Each(d.Running, path + ".running", (c, at) => new RunningCost(Name(c.Name, "running cost"), Amount(c.Yearly, at + ".yearly", 0) ?? 0, Amount(c.PerKwh, at + ".perKwh", 0) ?? 0, Escalation(c.Escalation, at + ".escalation", usual, read))),
            Replacements = Each(d.Replacements, path + ".replacements", (c, at) => new Replacement(Name(c.Name, "replacement"), Needed(c.Amount, at + ".amount"), Years(c.EveryYears, at + ".everyYears"), Escalation(c.Escalation, at + ".escalation", usual, read))),
            Credits = Each(d.Credits, path + ".credits", (c, at) => new Credit(Name(c.Name, "credit"), Amount(c.Yearly, at + ".yearly", 0) ?? 0, Amount(c.PerKwh, at + ".perKwh", 0) ?? 0, read.Whole(c.Years, at + ".years", 1, 100) ?? 100, Escalation(c.Escalation, at + ".escalation", usual, read))),
            GrantAmount = Amount(d.Grants, path + ".grants", 0) ?? 0,
            SalvageAmount = Amount(d.Salvage, path + ".salvage", -Most) ?? 0,
            Loan = d.Loan is { } loan
                ? new LoanShare(read.Quantity(loan.Share, Dimension.Ratio, path + ".loan.share", 0, 1), read.Quantity(loan.Interest, Dimension.Ratio, path + ".loan.interest", 0, 0.5), Years(loan.Years, path + ".loan.years"))
                : null,
            Tax = d.Tax is { } tax
                ? new TaxEntry(read.Quantity(tax.Rate, Dimension.Ratio, path + ".tax.rate", 0, 1), read.Optional(tax.Depreciable, Dimension.Ratio, path + ".tax.depreciable", 0, 1) ?? 1, Written(tax.Depreciation, path + ".tax.depreciation", read))
                : null,
            Indexes = Each(d.Indexes, path + ".indexes", Index),
        };
        return read.Problems.Count == before ? input : null;

        double? Amount(string? text, string where, double lowest) => AmountText.Read(text, basis, where, lowest, Most, read);

        double Needed(string? text, string where)
        {
            if (string.IsNullOrWhiteSpace(text))
                read.Refuse(where, text, "nothing is entered", "an amount");
            return Amount(text, where, 0) ?? 0;
        }

        PriceIndex Index(PriceIndexDocument c, string at)
        {
            if (string.IsNullOrWhiteSpace(c.Name))
                read.Refuse(at + ".name", c.Name, "an index must be named", "as 'construction cost index of ...'");
            if (string.IsNullOrWhiteSpace(c.FromYear))
                read.Refuse(at + ".fromYear", c.FromYear, "nothing is entered", "a year");
            if (string.IsNullOrWhiteSpace(c.Ratio))
                read.Refuse(at + ".ratio", c.Ratio, "nothing is entered", "index of the price year over that of the earlier year");
            return new PriceIndex(c.Name?.Trim() ?? "", read.Whole(c.FromYear, at + ".fromYear", 1900, 2200) ?? 2000, read.Number(c.Ratio, at + ".ratio", 0.01, 1000) ?? 1);
        }

        int Years(string? text, string where)
        {
            if (string.IsNullOrWhiteSpace(text))
                read.Refuse(where, text, "nothing is entered", "1 to 100");
            return read.Whole(text, where, 1, 100) ?? 1;
        }
    }

    private static MoneyBasis? Basis(MoneyDocument d, string path, FieldReader read)
    {
        var code = d.Currency?.Trim() ?? "";
        var good = code.Length == 3 && code.All(char.IsAsciiLetter);
        if (!good)
            read.Refuse(path + ".currency", d.Currency, code.Length == 0 ? "nothing is entered" : "a currency is three letters", "USD, EUR, CAD ...");
        if (string.IsNullOrWhiteSpace(d.PriceYear))
            read.Refuse(path + ".priceYear", d.PriceYear, "nothing is entered", "the year of the prices, as 2026");
        var year = read.Whole(d.PriceYear, path + ".priceYear", 1950, 2200);
        return good && year is { } known ? MoneyBasis.Of(code, known) : null;
    }

    private static CostLine Line(CostLineDocument c, double usualContingency, MoneyBasis basis, string at, FieldReader read)
    {
        var kind = read.Named(c.Class, at + ".class", CostClasses.Find, CostClasses.All.Select(k => k.Id)) ?? CostClasses.Other;
        if (string.IsNullOrWhiteSpace(c.UnitPrice))
            read.Refuse(at + ".unitPrice", c.UnitPrice, "nothing is entered", "the price of one unit");
        return new CostLine(
            Name(c.Name, kind.Name),
            kind,
            read.Number(c.Quantity, at + ".quantity", 0, 1e9) ?? 1,
            c.Unit?.Trim() ?? "",
            Money.Of(AmountText.Read(c.UnitPrice, basis, at + ".unitPrice", 0, Most, read) ?? 0, basis),
            read.Optional(c.Contingency, Dimension.Ratio, at + ".contingency", 0, 2) ?? usualContingency);
    }

    private static double Escalation(string? text, string where, double usual, FieldReader read) => read.Optional(text, Dimension.Ratio, where, -0.2, 0.3) ?? usual;

    private static string Name(string? text, string otherwise) => string.IsNullOrWhiteSpace(text) ? otherwise : text.Trim();

    private static List<TOut> Each<TIn, TOut>(List<TIn>? list, string path, Func<TIn, string, TOut> build) =>
        [.. (list ?? []).Select((item, i) => build(item, $"{path}[{i.ToString(CultureInfo.InvariantCulture)}]"))];

    private static Depreciation Written(string? text, string where, FieldReader read)
    {
        var straight = StraightLine().Match(text ?? "");
        if (straight.Success && int.Parse(straight.Groups[1].Value, CultureInfo.InvariantCulture) is >= 1 and <= 100 and var over)
            return Depreciation.StraightLine(over);
        var declining = Declining().Match(text ?? "");
        if (declining.Success
            && int.Parse(declining.Groups[1].Value, CultureInfo.InvariantCulture) is >= 2 and <= 60 and var years
            && double.Parse(declining.Groups[2].Value, CultureInfo.InvariantCulture) is >= 1 and <= 4 and var factor)
        {
            return Depreciation.DecliningBalance(years, factor);
        }

        var parts = (text ?? "").Split(',', StringSplitOptions.RemoveEmptyEntries | StringSplitOptions.TrimEntries);
        var shares = parts.Select(p => QuantityText.Read(p, Dimension.Ratio, null, where)).ToList();
        if (shares.Count > 0 && shares.All(s => s.IsGood && s.Value is >= 0 and <= 1) && shares.Sum(s => s.Value) <= 1.000001)
            return Depreciation.Given(shares.Select(s => s.Value));
        read.Refuse(where, text, "this schedule is not understood", "'straight line 20', 'declining balance 15 x 1.5', or the shares of the years: '20 %, 32 %, 19.2 %, ...', at most 100 % together");
        return Depreciation.StraightLine(1);
    }

    [GeneratedRegex(@"^\s*straight line (\d{1,3})\s*$", RegexOptions.IgnoreCase)]
    private static partial Regex StraightLine();

    [GeneratedRegex(@"^\s*declining balance (\d{1,2}) x (\d(?:\.\d+)?)\s*$", RegexOptions.IgnoreCase)]
    private static partial Regex Declining();
}

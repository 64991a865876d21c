using HeadToWatts.Basis.Sources;

namespace HeadToWatts.Economics.CashFlows;

/// <summary>The methods of a cash flow.</summary>
public static class CashFlowMethods
{
    /// <summary>R. Panneerselvam, Engineering Economics.</summary>
    public static Source Panneerselvam { get; } = new("panneerselvam", SourceKind.Published, "R. Panneerselvam", "", "Engineering Economics", "interest formulas, chapter 3; present worth, chapter 4; rate of return, chapter 7; depreciation, chapter 9");

    /// <summary>Short, Packey and Holt: levelised cost.</summary>
    public static Source Short { get; } = new("short-1995", SourceKind.Published, "W. Short, D. J. Packey and T. Holt", "1995", "A manual for the economic evaluation of energy efficiency and renewable energy technologies", "NREL/TP-462-5173");

    /// <summary>The relation of real and nominal rates.</summary>
    public static Source Fisher { get; } = Source.CommonPractice("fisher-relation", "Real and nominal rates of interest, after I. Fisher");

    /// <summary>Modified rate of return.</summary>
    public static Source ModifiedPractice { get; } = Source.CommonPractice("modified-rate", "Modified internal rate of return, as spreadsheets define it");

    /// <summary>Declining balance with half a year.</summary>
    public static Source Publication946 { get; } = new("irs-946", SourceKind.Law, "US Internal Revenue Service", "", "Publication 946, How to depreciate property", "table A-1, half-year convention");

    /// <summary>Net present value.</summary>
    public static Method NetPresentValue { get; } = new("net-present-value", "Net present value", "NPV = Σ C_t (1 + d)^{−t}", Panneerselvam, "chapter 4", []);

    /// <summary>Uniform series.</summary>
    public static Method UniformSeries { get; } = new("uniform-series", "Present worth of a uniform series", "P/A = ((1 + i)^n − 1)/(i(1 + i)^n)", Panneerselvam, "chapter 3", []);

    /// <summary>Growing series.</summary>
    public static Method GrowingSeries { get; } = new("growing-series", "Present worth of a growing series", "P/A_1 = (1 − ((1 + g)/(1 + d))^n)/(d − g)", Panneerselvam, "chapter 3", []);

    /// <summary>Internal rate of return.</summary>
    public static Method InternalRate { get; } = new("internal-rate-of-return", "Internal rate of return, every root", "Σ C_t (1 + i)^{−t} = 0", Panneerselvam, "chapter 7", []);

    /// <summary>Modified rate of return.</summary>
    public static Method ModifiedRate { get; } = new("modified-rate-of-return", "Modified internal rate of return", "i_m = (F_{in}/P_{out})^{1/n} − 1", ModifiedPractice, "", []);

    /// <summary>Levelised cost.</summary>
    public static Method LevelisedCost { get; } = new("levelised-cost", "Levelised cost of energy", "LCOE = Σ K_t(1 + d)^{−t}/Σ E_t(1 + d)^{−t}", Short, "levelized cost of energy", []);

    /// <summary>Level loan.</summary>
    public static Method LevelLoan { get; } = new("level-loan", "Loan with level payments", "A = P i(1 + i)^n/((1 + i)^n − 1)", Panneerselvam, "chapter 3, capital recovery", []);

    /// <summary>Real rate.</summary>
    public static Method RealRate { get; } = new("real-rate", "Real from nominal rate", "1 + r = (1 + i)/(1 + f)", Fisher, "", []);

    /// <summary>Depreciation.</summary>
    public static Method DecliningBalance { get; } = new("declining-balance", "Declining balance turning to straight line", "D_t = max(k B_t/n, B_t/n_{left})", Publication946, "table A-1", []);

    /// <summary>Every method of a cash flow.</summary>
    public static IReadOnlyList<Method> All { get; } = [NetPresentValue, UniformSeries, GrowingSeries, InternalRate, ModifiedRate, LevelisedCost, LevelLoan, RealRate, DecliningBalance];
}

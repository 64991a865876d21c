using HeadToWatts.Basis.Quantities;

namespace HeadToWatts.Economics.Costs;

/// <summary>One line of a cost estimate.</summary>
/// <param name="Name">What is bought or built.</param>
/// <param name="Class">Its class.</param>
/// <param name="QuantityNumber">How much of it, 0 or more.</param>
/// <param name="QuantityUnit">Unit of the quantity, as the author writes it.</param>
/// <param name="UnitPrice">Price of one unit.</param>
/// <param name="ContingencyRatio">Added for what is not known yet, over the line's cost.</param>
public sealed record CostLine(string Name, CostClass Class, double QuantityNumber, string QuantityUnit, Money UnitPrice, double ContingencyRatio)
{
    /// <summary>Quantity times price, without contingency.</summary>
    public Money Direct => UnitPrice.Times(QuantityNumber);
}

/// <summary>The cost of one class.</summary>
/// <param name="Class">The class.</param>
/// <param name="DirectAmount">Quantities times prices.</param>
/// <param name="ContingencyAmount">Contingency.</param>
public sealed record ClassCost(CostClass Class, double DirectAmount, double ContingencyAmount);

/// <summary>How the works are paid for while they are built.</summary>
/// <param name="ConstructionYears">Whole years of construction, 0 to 20; money flows evenly through them.</param>
/// <param name="InterestRate">Interest a year on what has been spent, in the terms of the plan.</param>
public sealed record Construction(int ConstructionYears, double InterestRate)
{
    /// <summary>Interest over the sum spent, up to the start of operation: each year's share is spent at its middle.</summary>
    public double InterestRatio
    {
        get
        {
            var sum = 0.0;
            for (var year = 1; year <= ConstructionYears; year++)
                sum += (Math.Pow(1 + InterestRate, ConstructionYears - year + 0.5) - 1) / ConstructionYears;
            return sum;
        }
    }
}

/// <summary>The capital cost built up from lines. The parts add up to the total.</summary>
public sealed record CostBuildUp
{
    private CostBuildUp(MoneyBasis basis, IReadOnlyList<CostLine> lines, IReadOnlyList<ClassCost> classes, double engineeringAmount, double interestAmount, double engineeringRatio, Construction construction)
    {
        Basis = basis;
        Lines = lines;
        Classes = classes;
        EngineeringAmount = engineeringAmount;
        InterestAmount = interestAmount;
        EngineeringRatio = engineeringRatio;
        Construction = construction;
    }

    /// <summary>Currency and price year.</summary>
    public MoneyBasis Basis { get; }

    /// <summary>The lines.</summary>
    public IReadOnlyList<CostLine> Lines { get; }

    /// <summary>The classes that have a line, in the order of <see cref="CostClasses"/>.</summary>
    public IReadOnlyList<ClassCost> Classes { get; }

    /// <summary>Engineering and management over the cost of the works.</summary>
    public double EngineeringRatio { get; }

    /// <summary>How it is paid for while it is built.</summary>
    public Construction Construction { get; }

    /// <summary>Quantities times prices.</summary>
    public double DirectAmount => Classes.Sum(c => c.DirectAmount);

    /// <summary>Contingency.</summary>
    public double ContingencyAmount => Classes.Sum(c => c.ContingencyAmount);

    /// <summary>Engineering and management.</summary>
    public double EngineeringAmount { get; }

    /// <summary>Interest during construction.</summary>
    public double InterestAmount { get; }

    /// <summary>Everything at the start of operation.</summary>
    public double TotalAmount => DirectAmount + ContingencyAmount + EngineeringAmount + InterestAmount;

    /// <summary>Everything at the start of operation, with its currency and price year.</summary>
    public Money Total => Money.Of(TotalAmount, Basis);

    /// <summary>Builds the cost up: contingency on each line, engineering on both together, interest on all three.</summary>
    /// <param name="basis">Currency and price year of the estimate.</param>
    /// <param name="lines">The lines.</param>
    /// <param name="engineeringRatio">Engineering and management over direct cost and contingency.</param>
    /// <param name="construction">How it is paid for while it is built.</param>
    /// <exception cref="ArgumentException">A line is in another currency or price year.</exception>
    public static CostBuildUp Of(MoneyBasis basis, IReadOnlyList<CostLine> lines, double engineeringRatio, Construction construction)
    {
        ArgumentNullException.ThrowIfNull(basis);
        ArgumentNullException.ThrowIfNull(lines);
        ArgumentNullException.ThrowIfNull(construction);
        var direct = Money.Of(0, basis);
        foreach (var line in lines)
            direct = direct.Plus(line.Direct);
        var classes = CostClasses.All
            .Select(c => (Class: c, Lines: lines.Where(l => l.Class.Id == c.Id).ToList()))
            .Where(g => g.Lines.Count > 0)
            .Select(g => new ClassCost(g.Class, g.Lines.Sum(l => l.Direct.Amount), g.Lines.Sum(l => l.Direct.Amount * l.ContingencyRatio)))
            .ToList();
        var works = direct.Amount + classes.Sum(c => c.ContingencyAmount);
        var engineering = works * engineeringRatio;
        return new CostBuildUp(basis, lines, classes, engineering, (works + engineering) * construction.InterestRatio, engineeringRatio, construction);
    }
}

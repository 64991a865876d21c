using HeadToWatts.Drawings.Canvas;
using HeadToWatts.Studies;
using HeadToWatts.Studies.Worth;

namespace HeadToWatts.Drawings;

public static partial class CashFlowChart
{
    /// <summary>Draws the cash of a study; null where no money is entered.</summary>
    public static Drawing? Draw(StudyResult result, DrawingSize size)
    {
        ArgumentNullException.ThrowIfNull(result);
        return result.Money is { } money
            ? Draw(new CashFlowInput(money.Basis, MoneyText.Terms(money.Flow.Plan), money.Flow.ProjectAmounts, money.Measures.PaybackYears), size)
            : null;
    }
}

public static partial class CostBuildUpChart
{
    /// <summary>Draws the capital cost of a study; null where none is entered.</summary>
    public static Drawing? Draw(StudyResult result, DrawingSize size)
    {
        ArgumentNullException.ThrowIfNull(result);
        return result.Money is { } money
            ? Draw(
                new CostBuildUpInput(money.Basis,
                [
                    .. money.Costs.Classes.Select(c => new CostPart(c.Class.Name, c.DirectAmount, false)),
                    new CostPart("Contingency", money.Costs.ContingencyAmount, true),
                    new CostPart("Engineering", money.Costs.EngineeringAmount, true),
                    new CostPart("Interest while building", money.Costs.InterestAmount, true),
                ]),
                size)
            : null;
    }
}

public static partial class SensitivityBarsChart
{
    /// <summary>Draws the bars of a study; null where money is not complete.</summary>
    public static Drawing? Draw(StudyResult result, DrawingSize size)
    {
        ArgumentNullException.ThrowIfNull(result);
        return result.Money is { } money
            ? Draw(new SensitivityInput(money.Basis, money.Measures.NetPresentValueAmount, money.Bars), size)
            : null;
    }
}

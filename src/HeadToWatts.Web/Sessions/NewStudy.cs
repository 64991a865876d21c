using HeadToWatts.Basis.Units;
using HeadToWatts.Files.StudyFiles;

namespace HeadToWatts.Web.Sessions;

/// <summary>Makes the study that a visitor begins with.</summary>
public static class NewStudy
{
    // Small pipes are bought in plastic, large ones in steel; the material stands in the study to be changed.
    private const double LargestPlasticDiameterM = 0.63;

    /// <summary>A study from three numbers: a flow held all year, a head, and a pipe.</summary>
    /// <param name="units">Family of units.</param>
    /// <param name="flow">Flow, with its unit.</param>
    /// <param name="grossHead">Gross head, with its unit.</param>
    /// <param name="pipeLength">Length of the pipe, with its unit; null when there is no pipe.</param>
    /// <param name="pipeDiameter">Inside diameter of the pipe, with its unit; null when there is no pipe.</param>
    public static StudyDocument FromNumbers(UnitSystem units, string? flow, string? grossHead, string? pipeLength, string? pipeDiameter)
    {
        var alternative = new AlternativeDocument
        {
            Name = "First look",
            Flow = new FlowDocument
            {
                Curve = [new CurveRowDocument { Exceeded = "0 %", Flow = flow }, new CurveRowDocument { Exceeded = "100 %", Flow = flow }],
                Season = "all year",
            },
            Head = new HeadDocument { Gross = grossHead },
        };
        if (!string.IsNullOrWhiteSpace(pipeLength) || !string.IsNullOrWhiteSpace(pipeDiameter))
            alternative.Waterway.Elements.Add(Pipe("pipe", pipeLength, pipeDiameter));
        return new StudyDocument { Name = "New study", Units = units.ToString(), Alternatives = [alternative] };
    }

    /// <summary>A pipe with the fittings that no pipe is without: an entrance and a valve.</summary>
    /// <param name="name">Name.</param>
    /// <param name="length">Length, with its unit.</param>
    /// <param name="insideDiameter">Inside diameter, with its unit.</param>
    public static ElementDocument Pipe(string name, string? length, string? insideDiameter)
    {
        var isLarge = QuantityText.Read(insideDiameter, Dimension.Length, null, "").TryGet(out var diameterM) && diameterM > LargestPlasticDiameterM;
        return new ElementDocument
        {
            Name = name,
            Length = length,
            InsideDiameter = insideDiameter,
            Material = isLarge ? "steel-new" : "pvc",
            Fittings = [new FittingDocument { Fitting = "entrance-square" }, new FittingDocument { Fitting = "valve-butterfly" }],
        };
    }
}

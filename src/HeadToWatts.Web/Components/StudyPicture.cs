using HeadToWatts.Basis.Units;
using HeadToWatts.Drawings;
using HeadToWatts.Drawings.Canvas;
using HeadToWatts.Studies;
using Microsoft.AspNetCore.Components;
using Microsoft.AspNetCore.Components.Rendering;

namespace HeadToWatts.Web.Components;

/// <summary>
/// A drawing of a study as SVG in the page's own colours. It is drawn anew only when the result, the units, the size or the
/// flow looked at has changed: a page is rendered several times around each keystroke, and a picture is its dearest part.
/// </summary>
public sealed class StudyPicture : ComponentBase
{
    private (StudyResult?, UnitDisplay?, DrawingSize?, double?) _drawn;
    private bool _isDue = true;

    /// <summary>Identity in the page; unique there.</summary>
    [Parameter, EditorRequired] public string Id { get; set; } = "";

    /// <summary>The study.</summary>
    [Parameter, EditorRequired] public StudyResult Result { get; set; } = default!;

    /// <summary>Units in which numbers are shown.</summary>
    [Parameter, EditorRequired] public UnitDisplay Show { get; set; } = default!;

    /// <summary>Size of the drawing.</summary>
    [Parameter, EditorRequired] public DrawingSize Size { get; set; } = default!;

    /// <summary>Flow looked at, m3/s; null where the drawing shows every flow.</summary>
    [Parameter] public double? FlowM3PerS { get; set; }

    /// <summary>Draws it; null when there is nothing to draw.</summary>
    [Parameter, EditorRequired] public Func<StudyResult, UnitDisplay, DrawingSize, double?, Drawing?> Draw { get; set; } = default!;

    /// <summary>What stands in its place when there is nothing to draw.</summary>
    [Parameter] public RenderFragment? ChildContent { get; set; }

    /// <inheritdoc/>
    protected override void OnParametersSet()
    {
        var now = (Result, Show, Size, FlowM3PerS);
        _isDue = !ReferenceEquals(now.Result, _drawn.Item1) || !ReferenceEquals(now.Show, _drawn.Item2) || now.Size != _drawn.Item3 || now.FlowM3PerS != _drawn.Item4;
        _drawn = now;
    }

    /// <inheritdoc/>
    protected override bool ShouldRender() => _isDue;

    /// <inheritdoc/>
    protected override void BuildRenderTree(RenderTreeBuilder builder)
    {
        ArgumentNullException.ThrowIfNull(builder);
        if (Draw(Result, Show, Size, FlowM3PerS) is { } drawing)
            builder.AddMarkupContent(0, SvgWriter.Write(drawing, Id));
        else
            builder.AddContent(1, ChildContent);
    }
}

using System.Text;

namespace HeadToWatts.Drawings.Canvas;

/// <summary>
/// The style sheet of the drawings on a page. It names the page's own colour variables: --ink --soft --grid --line --water
/// --waterfill --ground --ochre --green --plum --amber --amberbg --paper --card.
/// </summary>
public static class DrawingStyles
{
    private static readonly string[] Variables =
        ["ink", "soft", "grid", "line", "water", "waterfill", "ground", "ochre", "green", "plum", "amber", "amberbg", "paper", "card"];

    /// <summary>The style sheet: include it once on a page.</summary>
    public static string Css { get; } = Build();

    /// <summary>The name of the colour variable of a role, as "waterfill".</summary>
    public static string Variable(InkRole role) => Variables[(int)role];

    /// <summary>The class that gives an outline its colour, as "ink-water".</summary>
    public static string InkClass(InkRole role) => "ink-" + Variable(role);

    /// <summary>The class that gives an area or a text its colour, as "fill-water".</summary>
    public static string FillClass(InkRole role) => "fill-" + Variable(role);

    /// <summary>The colour variables of a palette as declarations, for a page that has no theme of its own.</summary>
    public static string Declarations(Palette palette)
    {
        ArgumentNullException.ThrowIfNull(palette);
        var text = new StringBuilder();
        foreach (var role in Enum.GetValues<InkRole>())
            text.Append("--").Append(Variable(role)).Append(':').Append(palette[role]).Append(';');
        return text.ToString();
    }

    private static string Build()
    {
        var css = new StringBuilder();
        css.Append("svg.drawing{display:block;max-width:100%;height:auto;font-variant-numeric:tabular-nums}\n");
        css.Append("svg.drawing text{font-family:inherit;stroke:none}\n");
        css.Append("svg.drawing polyline,svg.drawing polygon{stroke-linejoin:round}\n");
        css.Append("svg.drawing .hollow{fill:none}\n");
        css.Append("svg.drawing text.halo{stroke:var(--card);stroke-width:3.5px;stroke-linejoin:round;paint-order:stroke}\n");
        css.Append("svg.drawing .hover .area{fill:var(--water);fill-opacity:0;stroke:none}\n");
        css.Append("svg.drawing .hover .dot{fill:var(--ink);stroke:var(--card);stroke-width:1.5;opacity:0;pointer-events:none}\n");
        css.Append("svg.drawing .hover:hover .area{fill-opacity:.07}\n");
        css.Append("svg.drawing .hover:hover .dot{opacity:1}\n");
        foreach (var role in Enum.GetValues<InkRole>())
        {
            css.Append("svg.drawing .").Append(InkClass(role)).Append("{stroke:var(--").Append(Variable(role)).Append(")}\n");
            css.Append("svg.drawing .").Append(FillClass(role)).Append("{fill:var(--").Append(Variable(role)).Append(")}\n");
        }

        return css.ToString();
    }
}

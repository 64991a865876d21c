namespace HeadToWatts.Files.StudyFiles;

/// <summary>A canal with a drop; every quantity a text.</summary>
public sealed class CanalDocument
{
    /// <summary>Above the drop.</summary>
    public CanalSideDocument Upstream { get; set; } = new();

    /// <summary>Below it.</summary>
    public CanalSideDocument Downstream { get; set; } = new();

    /// <summary>The stilling basin.</summary>
    public BasinDocument? Basin { get; set; }

    /// <summary>"none", "tailwater" or "both": which water levels of the plant follow from the canal's normal depth.</summary>
    public string? SetsLevels { get; set; }

    /// <summary>Other drops used on the same canal.</summary>
    public List<OtherDropDocument>? OtherDrops { get; set; }

    /// <summary>What passes the full flow when the plant stops.</summary>
    public string? Bypass { get; set; }

    internal static CanalDocument Fields(JsonObjectReader r) => new()
    {
        Upstream = r.Object("upstream", Side) ?? new CanalSideDocument(),
        Downstream = r.Object("downstream", Side) ?? new CanalSideDocument(),
        Basin = r.Object("basin", b => new BasinDocument { Width = b.Text("width"), Length = b.Text("length"), Floor = b.Text("floor") }),
        SetsLevels = r.Text("setsLevels"),
        OtherDrops = r.Array("otherDrops", o => new OtherDropDocument { Name = o.Text("name"), Headwater = o.Text("headwater"), Tailwater = o.Text("tailwater") }),
        Bypass = r.Text("bypass"),
    };

    private static CanalSideDocument Side(JsonObjectReader r) => new()
    {
        Shape = r.Text("shape"),
        Width = r.Text("width"),
        SideSlope = r.NumberText("sideSlope"),
        Diameter = r.Text("diameter"),
        Points = r.Array("points", p => new SurveyPointDocument { Distance = p.Text("distance"), Elevation = p.Text("elevation") }),
        ManningN = r.NumberText("manningN"),
        Slope = r.NumberText("slope"),
        Alpha = r.NumberText("alpha"),
        Bed = r.Text("bed"),
        Bank = r.Text("bank"),
    };
}

/// <summary>The canal on one side of a drop.</summary>
public sealed class CanalSideDocument
{
    /// <summary>"rectangular", "trapezoidal", "circular" or "natural".</summary>
    public string? Shape { get; set; }

    /// <summary>Width of the bed.</summary>
    public string? Width { get; set; }

    /// <summary>Horizontal over vertical of the sides of a trapezium.</summary>
    public string? SideSlope { get; set; }

    /// <summary>Diameter of a round one.</summary>
    public string? Diameter { get; set; }

    /// <summary>Points across a natural one.</summary>
    public List<SurveyPointDocument>? Points { get; set; }

    /// <summary>Manning's n.</summary>
    public string? ManningN { get; set; }

    /// <summary>Bed slope, fall over length.</summary>
    public string? Slope { get; set; }

    /// <summary>Kinetic energy coefficient; 1 when left out.</summary>
    public string? Alpha { get; set; }

    /// <summary>Elevation of the bed at the drop.</summary>
    public string? Bed { get; set; }

    /// <summary>Elevation of the lower bank.</summary>
    public string? Bank { get; set; }
}

/// <summary>A point across a natural canal.</summary>
public sealed class SurveyPointDocument
{
    /// <summary>Distance across.</summary>
    public string? Distance { get; set; }

    /// <summary>Elevation.</summary>
    public string? Elevation { get; set; }
}

/// <summary>A stilling basin.</summary>
public sealed class BasinDocument
{
    /// <summary>Width of its floor.</summary>
    public string? Width { get; set; }

    /// <summary>Length of its floor.</summary>
    public string? Length { get; set; }

    /// <summary>Elevation of its floor.</summary>
    public string? Floor { get; set; }
}

/// <summary>Another drop used on the same canal.</summary>
public sealed class OtherDropDocument
{
    /// <summary>Its name.</summary>
    public string? Name { get; set; }

    /// <summary>Level above it.</summary>
    public string? Headwater { get; set; }

    /// <summary>Level below it.</summary>
    public string? Tailwater { get; set; }
}

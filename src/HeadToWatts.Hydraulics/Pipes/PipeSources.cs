using HeadToWatts.Basis.Sources;

namespace HeadToWatts.Hydraulics.Pipes;

/// <summary>Sources of the pipe figures.</summary>
internal static class PipeSources
{
    public static readonly Source White = new(
        "white-7", SourceKind.Published, "White, F. M.", "2011", "Fluid Mechanics, 7th edition", "McGraw-Hill");

    public static readonly Source Binder = new(
        "binder-1973", SourceKind.Published, "Binder, R. C.", "1973", "Fluid Mechanics", "Prentice-Hall");

    public static readonly Source HydraulicInstitute = new(
        "hydraulic-institute", SourceKind.Published, "Hydraulic Institute", "", "Engineering Data Book", "Hydraulic Institute");

    public static readonly Source Memory = Source.Memory("typical-pipe-figures", "Pipe roughness, velocity and wall usual in practice");
}

using HeadToWatts.Basis.Units;

namespace HeadToWatts.Web.Hosting;

/// <summary>What a visitor chose and the browser remembers. Anything unexpected in a cookie counts as no choice.</summary>
/// <param name="Theme">"light", "dark", or null to follow the system.</param>
/// <param name="Units">The family of units shown, or null when none was chosen.</param>
public sealed record Preferences(string? Theme, UnitSystem? Units)
{
    /// <summary>No choice made.</summary>
    public static Preferences None { get; } = new(null, null);

    /// <summary>Reads the choices from the cookies.</summary>
    /// <param name="cookies">Cookies of the request.</param>
    public static Preferences From(IRequestCookieCollection? cookies)
    {
        if (cookies is null)
            return None;
        return new Preferences(
            cookies["theme"] switch { "light" => "light", "dark" => "dark", _ => null },
            cookies["units"] switch { "US" => UnitSystem.US, "SI" => UnitSystem.SI, _ => null });
    }
}

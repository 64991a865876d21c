namespace HeadToWatts.Studies.Cautions;

/// <summary>A hazard or permit that every scheme must look at, whatever its numbers.</summary>
/// <param name="Title">What it is.</param>
/// <param name="Text">What to do about it.</param>
/// <param name="Authority">Whose rules govern.</param>
public sealed record StandingCaution(string Title, string Text, string Authority);

/// <summary>What always stands on the screen and in the memo.</summary>
public static class StandingCautions
{
    /// <summary>What the result is and is not.</summary>
    public static string Status => "Screening, not for construction";

    /// <summary>What the result is and is not, in full.</summary>
    public static string Statement =>
        "This is a screening of whether a site deserves closer study. It is not a design, not a feasibility study, not legal advice, and no promise of energy or income. "
        + "Structures, old drops and basins, bypass capacity, ground and grid were not examined. Local codes govern, and licensed engineers, electricians and counsel must check what is built on it.";

    /// <summary>Hazards, with the authority for each in the United States; elsewhere the national code governs.</summary>
    public static IReadOnlyList<StandingCaution> Hazards { get; } =
    [
        new("Drowning at canal, intake and rack", "Fence, mark and cover; give ropes and ladders; keep the public away from racks and tailrace.", "Owner's safety plan, local code"),
        new("Full flow after a trip", "When the machine trips, the whole flow must pass it at once and by itself. Show the bypass and its capacity before anything else; a blocked canal overtops.", "Canal owner's operating rules, licensed engineer"),
        new("Pressure surge, vacuum, trapped air", "Fast closing can burst a pipe and a sudden emptying can collapse it. An engineer's transient study sets closing times, vents and pipe class.", "Licensed engineer; pipe maker's rating"),
        new("Overspeed and rotating parts", "Without load a turbine runs away to up to three times its speed. Generator, gear and belt must survive it; guard every shaft.", "Maker's runaway figure; 29 CFR 1910 subpart O"),
        new("Electrocution and arc flash", "Work by qualified persons only, to the electrical code.", "29 CFR 1910.269; NFPA 70 and 70E"),
        new("Islanding and interconnection", "A plant that feeds a dead line can kill. Protection and the utility's consent come before the first kilowatt-hour.", "IEEE 1547; the utility's agreement"),
        new("Stored energy", "Lock out water, springs, pressure and electricity before hands go in.", "29 CFR 1910.147"),
        new("Confined space", "Penstock, draft tube and sump can hold bad air and sudden water: permit, gas test, attendant.", "29 CFR 1910.146"),
        new("Trash rack", "Suction holds a person; raking is heavy work near deep water; a blocked rack starves the machine and overtops the canal.", "Owner's safety plan"),
        new("Ice and frazil", "Ice blocks racks, bursts idle pipes and overloads structures.", "Local experience, licensed engineer"),
        new("Old drops, walls and embankments", "Do not assume an old structure is sound or its basin able to take the flow. Have it inspected.", "State dam safety office, licensed engineer"),
        new("Fish", "Intakes and runners injure fish; screens and passage may be required.", "State and federal fish agencies"),
        new("Trenching, lifting, buried services, oil", "Shore trenches, locate services, rate the crane, contain oil.", "29 CFR 1926; local code"),
    ];

    /// <summary>Permits commonly met in the United States; check current law, for it changes. Elsewhere the national rules govern.</summary>
    public static IReadOnlyList<StandingCaution> Permits { get; } =
    [
        new("Who owns the waterway", "On a federal conduit a lease of power privilege is offered to the irrigation district first, and irrigation stays first. Elsewhere the owner's consent.", "43 USC 485h(c); Pub. L. 113-24"),
        new("Federal hydropower law", "A non-federal conduit built mainly for farm, city or industrial water, up to 40 MW, may qualify by a notice of intent: 15 days for the first view, then 30 days to contest. Otherwise an exemption or a licence.", "16 USC 823a; 18 CFR part 4"),
        new("Water right", "Power is usually a use of its own: season, rate, point of return. Ask even on an existing ditch.", "State water-rights office"),
        new("Streams and wetlands", "Dredge and fill, water quality certificate, protected species, historic structures: old drops are often historic.", "Clean Water Act 404 and 401; ESA section 7; NHPA section 106"),
        new("Building and electrical", "County, building and electrical permits.", "Local code"),
        new("Grid", "Interconnection application, meter, tariff; status as a qualifying facility where it applies.", "State commission; IEEE 1547; 18 CFR part 292"),
        new("Elsewhere", "Abstraction licence, ecological flow, environmental screening, planning, dam-safety class, grid code, consent of land and canal company.", "National and local law"),
    ];
}

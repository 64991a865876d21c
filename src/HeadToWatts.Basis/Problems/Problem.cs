namespace HeadToWatts.Basis.Problems;

/// <summary>One thing wrong with an input, told so that its author can mend it.</summary>
/// <param name="Where">File, row, column or field.</param>
/// <param name="Read">What was read there.</param>
/// <param name="Why">Why it is refused.</param>
/// <param name="Accepted">What would be accepted; empty when that is plain from the reason.</param>
public sealed record Problem(string Where, string Read, string Why, string Accepted = "")
{
    /// <summary>The problem on one line: where: what was read: why (accepted: ...).</summary>
    public override string ToString()
    {
        var line = $"{Where}: {(Read.Length == 0 ? "(nothing)" : Read)}: {Why}";
        if (Accepted.Length > 0)
            line += $" (accepted: {Accepted})";
        return line.ReplaceLineEndings(" ");
    }
}

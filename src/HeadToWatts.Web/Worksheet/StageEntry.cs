namespace HeadToWatts.Web.Worksheet;

/// <summary>One stage at the side.</summary>
/// <param name="Key">The last part of its address.</param>
/// <param name="Title">Its name.</param>
/// <param name="Result">Its key result in a few words.</param>
/// <param name="Cautions">How many cautions belong to it.</param>
/// <param name="Problems">How many of its fields are refused.</param>
public sealed record StageEntry(string Key, string Title, string Result, int Cautions, int Problems);

namespace HeadToWatts.Web.Fields;

/// <summary>Something that may be chosen.</summary>
/// <param name="Value">What is stored.</param>
/// <param name="Text">What is read.</param>
public sealed record Choice(string Value, string Text);

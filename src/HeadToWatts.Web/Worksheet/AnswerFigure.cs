namespace HeadToWatts.Web.Worksheet;

/// <summary>One figure of the answer that is always in view.</summary>
/// <param name="Key">Identity of the figure.</param>
/// <param name="Label">What it is.</param>
/// <param name="Value">The number or name.</param>
/// <param name="Unit">Small text beside it: a unit, a count.</param>
/// <param name="Note">What it is out of, in one plain line.</param>
/// <param name="Exact">The number at full precision, shown on hover; empty when there is none.</param>
/// <param name="IsCaution">True when it counts cautions.</param>
/// <param name="OnPhone">True when it stays on a phone.</param>
public sealed record AnswerFigure(string Key, string Label, string Value, string Unit, string Note, string Exact = "", bool IsCaution = false, bool OnPhone = true);

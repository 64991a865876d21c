using HeadToWatts.Basis.Sources;

namespace HeadToWatts.Studies.Workings;

/// <summary>How one number came about. The same text stands on the screen and in the memo.</summary>
/// <param name="Id">Key: lower-case words with hyphens.</param>
/// <param name="Stage">Stage it belongs to.</param>
/// <param name="Title">What is worked out.</param>
/// <param name="Formula">Formula in symbols, in the notation of <see cref="FormulaText"/>.</param>
/// <param name="Numbers">The same with this study's numbers and units.</param>
/// <param name="Result">The result with its unit.</param>
/// <param name="Note">What else the reader should know; may be empty.</param>
/// <param name="Methods">The methods behind it; their sources are printed with it.</param>
public sealed record Working(string Id, StudyStage Stage, string Title, string Formula, string Numbers, string Result, string Note, IReadOnlyList<Method> Methods);

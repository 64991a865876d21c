namespace HeadToWatts.Memos.Content;

/// <summary>Size of the paper.</summary>
public enum Paper
{
    /// <summary>US Letter, 8.5 by 11 inches.</summary>
    Letter,

    /// <summary>ISO A4, 210 by 297 mm.</summary>
    A4,
}

/// <summary>A memo, independent of how it is drawn.</summary>
/// <param name="Title">Title of the document.</param>
/// <param name="Subject">What it is about, in a line.</param>
/// <param name="Author">Who answers for it; may be empty.</param>
/// <param name="Language">Language tag, as "en".</param>
/// <param name="Date">Its date; null when none was given.</param>
/// <param name="Paper">Size of the paper.</param>
/// <param name="HeaderLeft">At the left of the page head, from the second page on.</param>
/// <param name="HeaderRight">At the right of the page head.</param>
/// <param name="FooterLeft">At the left of the page foot.</param>
/// <param name="Blocks">The body.</param>
public sealed record MemoDocument(
    string Title,
    string Subject,
    string Author,
    string Language,
    DateOnly? Date,
    Paper Paper,
    string HeaderLeft,
    string HeaderRight,
    string FooterLeft,
    IReadOnlyList<Block> Blocks);

using HeadToWatts.Memos.Content;

namespace HeadToWatts.Memos.Sections;

/// <summary>The contents, after the answer: who reads one page only has read the right one.</summary>
internal static class ContentsSection
{
    public static void Write(MemoContext memo) => memo.Body.Add(new ContentsBlock());
}

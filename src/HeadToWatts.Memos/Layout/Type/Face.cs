namespace HeadToWatts.Memos.Layout.Type;

/// <summary>The faces of the memo's one typeface.</summary>
internal enum Face
{
    Regular,
    Italic,
    SemiBold,
}

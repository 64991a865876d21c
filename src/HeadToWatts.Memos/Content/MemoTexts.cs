using HeadToWatts.Drawings.Canvas;

namespace HeadToWatts.Memos.Content;

/// <summary>Every text a reader of the memo sees, in order.</summary>
public static class MemoTexts
{
    /// <summary>The texts of the page heads and of the body, those inside figures too.</summary>
    public static IEnumerable<string> Of(MemoDocument document)
    {
        ArgumentNullException.ThrowIfNull(document);
        return new[] { document.HeaderLeft, document.HeaderRight, document.FooterLeft }.Concat(document.Blocks.SelectMany(Of));
    }

    private static IEnumerable<string> Of(Block block) => block switch
    {
        HeadingBlock b => [b.Text],
        ParagraphBlock b => [b.Text.Plain],
        FormulaBlock b => [b.Formula.Plain, b.Remark.Plain],
        ListBlock b => [.. b.Labels, .. b.Items.Select(i => i.Plain)],
        TableBlock b => [b.Caption.Plain, .. b.Columns.Select(c => c.Head.Plain), .. b.Rows.SelectMany(r => r.Cells).Select(c => c.Plain), b.Note.Plain],
        FigureBlock b => [b.Caption.Plain, .. b.Drawing.Operations.OfType<TextOperation>().Select(o => o.Content)],
        CalloutBlock b => [b.Heading.Plain, b.Text.Plain, b.Remark.Plain],
        KeyFiguresBlock b => [.. b.Figures.SelectMany(f => new[] { f.Name, f.Value, f.Unit, f.Note.Plain })],
        TitleBlock b => [b.Kicker, b.Title, b.Subtitle, b.Status, .. b.Facts.SelectMany(f => new[] { f.Name, f.Value })],
        _ => [],
    };
}

using HeadToWatts.Drawings.Canvas;
using HeadToWatts.Memos.Layout;
using HeadToWatts.Memos.Layout.Type;
using PdfSharp.Drawing;
using PdfSharp.Pdf;
using PdfSharp.Pdf.Annotations;
using PdfSharp.UniversalAccessibility;

namespace HeadToWatts.Memos.Pdf;

/// <summary>
/// Paints pages and tags what it paints. The library writes marks and text objects to one stream as they come, so this class sees
/// to it that neither crosses the other: marks open and close outside text objects, except that the library itself opens the first
/// mark of a page inside one, which is therefore closed inside it.
/// </summary>
internal sealed class PagePainter(PdfDocument document, MemoLayout layout)
{
    private readonly UAManager _tags = UAManager.ForDocument(document);
    private readonly Dictionary<(Face, double), XFont> _fonts = [];
    private readonly List<PdfOutline> _outline = [];
    private PdfPage _page = null!;
    private XGraphics _graphics = null!;
    private bool _nothingMarked;
    private bool _openInText;

    public void Paint()
    {
        foreach (var page in layout.Pages)
        {
            _page = document.AddPage();
            _page.Width = XUnit.FromPoint(layout.WidthPt);
            _page.Height = XUnit.FromPoint(layout.HeightPt);
            _graphics = XGraphics.FromPdfPage(_page);
            _nothingMarked = true;
            _openInText = false;
            // The library sets up a page with its first text; that must not happen between a mark and its text.
            Decoration(Space);
            foreach (var op in page.Ops)
                Do(op);
            EndMark();
            _graphics.Dispose();
        }
    }

    private void Do(Op op)
    {
        switch (op)
        {
            case OpenTag tag:
                Open(tag);
                break;
            case OpenFigure figure:
                OpenPicture(figure);
                break;
            case CloseTag:
                EndMark();
                _tags.StructureBuilder.End();
                _tags.BeginGraphicMode();
                break;
            case TextOp { Decoration: true } text:
                Decoration(() => Draw(text));
                break;
            case TextOp { Target.Length: > 0 } text:
                Link(text);
                break;
            case TextOp text:
                Marked(() => Draw(text));
                break;
            case FillOp fill:
                Decoration(() => _graphics.DrawRectangle(new XSolidBrush(PdfCanvas.Rgb(fill.Colour)), fill.XPt, fill.YPt, fill.WidthPt, fill.HeightPt));
                break;
            case RuleOp rule:
                Decoration(() => _graphics.DrawLine(new XPen(PdfCanvas.Rgb(rule.Colour), rule.ThicknessPt), rule.XPt, rule.YPt, rule.XPt + rule.WidthPt, rule.YPt));
                break;
            case DrawingOp drawing:
                drawing.Drawing.DrawOn(new PdfCanvas(_graphics, drawing.XPt, drawing.YPt, drawing.Scale, Font));
                break;
            case OutlineOp entry:
                AddOutline(entry);
                break;
        }
    }

    private void Open(OpenTag tag)
    {
        EndMark();
        if (tag.Grouping)
            _tags.StructureBuilder.BeginGroupingElement("/" + tag.Tag);
        else
            _tags.StructureBuilder.BeginBlockLevelElement("/" + tag.Tag);
        if (tag.Scope.Length > 0)
            _tags.StructureBuilder.CurrentStructureElement.TableAttributes.Elements.SetName("/Scope", "/" + tag.Scope);
    }

    private void OpenPicture(OpenFigure figure)
    {
        EndMark();
        // The first mark of a page opens inside a text object, where a drawing may not stand: a space takes that place.
        if (_nothingMarked)
        {
            _tags.StructureBuilder.BeginBlockLevelElement("/P");
            Marked(Space);
            EndMark();
            _tags.StructureBuilder.End();
        }

        _tags.BeginGraphicMode();
        // The box is counted from the foot of the page.
        var bottom = layout.HeightPt - figure.YPt - figure.HeightPt;
        _tags.StructureBuilder.BeginIllustrationElement("/Figure", figure.AltText, new XRect(figure.XPt, bottom, figure.WidthPt, figure.HeightPt));
    }

    private void Space() => _graphics.DrawString(" ", Font(Face.Regular, Look.BodyPt), XBrushes.Black, Look.MarginXPt, Look.BodyTopPt, XStringFormats.BaseLineLeft);

    private void Marked(Action draw)
    {
        if (_nothingMarked)
        {
            _nothingMarked = false;
            _openInText = true;
        }

        draw();
    }

    private void EndMark()
    {
        if (_openInText)
            _tags.BeginTextMode();
        else
            _tags.BeginGraphicMode();
        _tags.StructureBuilder.EndMarkedContentsWithId();
        _openInText = false;
        _tags.BeginGraphicMode();
    }

    private void Decoration(Action draw)
    {
        EndMark();
        _tags.StructureBuilder.BeginArtifact();
        draw();
        _tags.BeginGraphicMode();
        _tags.StructureBuilder.End();
        _tags.BeginGraphicMode();
    }

    private void Draw(TextOp text) =>
        _graphics.DrawString(text.Text, Font(text.Face, text.SizePt), new XSolidBrush(PdfCanvas.Rgb(text.Colour)), text.XPt, text.YPt, XStringFormats.BaseLineLeft);

    private void Link(TextOp text)
    {
        if (!layout.Anchors.TryGetValue(text.Target, out var place))
            throw new InvalidOperationException($"A link leads to '{text.Target}', which is not in the memo.");
        EndMark();
        var bottom = layout.HeightPt - text.YPt - text.SizePt * 0.25;
        var box = new PdfRectangle(new XPoint(text.XPt, bottom), new XPoint(text.XPt + text.WidthPt, bottom + text.SizePt * 1.15));
        var annotation = PdfLinkAnnotation.CreateDocumentLink(box, place.Page, new XPoint(0, layout.HeightPt - Math.Max(0, place.YPt - 12)));
        _tags.StructureBuilder.BeginElement(annotation, "Go to " + text.Text.Trim());
        Marked(() => Draw(text));
        EndMark();
        _tags.StructureBuilder.End();
        _tags.BeginGraphicMode();
    }

    private void AddOutline(OutlineOp entry)
    {
        var node = new PdfOutline(entry.Title, _page, opened: true)
        {
            PageDestinationType = PdfPageDestinationType.Xyz,
            Left = 0,
            Top = layout.HeightPt - Math.Max(0, entry.YPt - 12),
        };
        if (entry.Level > 1 && _outline.Count > 0)
        {
            _outline[^1].Outlines.Add(node);
            return;
        }

        document.Outlines.Add(node);
        _outline.Add(node);
    }

    private XFont Font(Face face, double sizePt)
    {
        if (!_fonts.TryGetValue((face, sizePt), out var font))
            _fonts[(face, sizePt)] = font = MemoFonts.Font(face, sizePt);
        return font;
    }
}

using System.Globalization;
using HeadToWatts.Basis.Sources;
using HeadToWatts.Drawings.Canvas;
using HeadToWatts.Memos.Content;

namespace HeadToWatts.Memos.Tests;

/// <summary>A memo with every kind of block, whose numbers mean nothing.</summary>
internal static class Sample
{
    public static Source Book { get; } = new("book", SourceKind.Published, "A. Author, B. Author", "1999", "A book on pipes", "Some publisher");

    public static MemoDocument Memo(Paper paper = Paper.Letter, int rows = 70, string title = "Example drop", int paragraphs = 6)
    {
        var b = new MemoBuilder();
        b.Add(new TitleBlock("Pre-feasibility memo", title, "Water power at a canal drop", "Screening. Not for construction.",
        [
            ("Client", "Example Irrigation District"), ("Author", "N. N."), ("Date", "2026-03-01"), ("Revision", "B"),
            ("Flow data", "1 Oct 1995 to 30 Sep 2025, daily means"), ("Accuracy", "Class 5: screening"),
        ]));
        b.Section("The answer", "answer");
        b.Say("A plant of 163 kW would give about 1 090 MWh in a mean year. Every number here is made up.", ParagraphKind.Lead);
        b.Add(new KeyFiguresBlock(
        [
            new("Power", "163", "kW", "at the meter, at design flow"), new("Energy", "1 090", "MWh a year", "mean of 30 years"),
            new("Net head", "17.1", "ft", "of 18.5 ft gross"), new("Plant factor", "0.52", "", "4 560 full-load hours"),
        ]));
        b.Add(new ContentsBlock());
        b.Section("Text", "text");
        for (var i = 0; i < paragraphs; i++)
        {
            b.Say(RichText.Of("Losses follow ") + RichText.Formula("h_f = f (L/D) V^2/2g") + " " + b.Cite(Book, "Eq. 7") + ", see " + RichText.See("fig-line")
                + ". The kinematic viscosity is 1.31 × 10⁻⁶ m²/s, γ = 9 798 N/m³, η ≥ 0.85 − 0.02, ν ≤ 1.4, ρ, Σ, √2, H₁ and so on… A wide-spread, half-open sentence with a hyphen that goes on until the line has to be broken at least once or twice.");
        }

        b.Add(new FormulaBlock(RichText.Formula("H_{net} = H_{gross} − Σ h_f − Σ K V^2/2g"), b.Cite(Book, "Eq. 1")));
        b.Add(ListBlock.Bullets("First unknown: the tailwater level at high flow, which nobody has measured so far and which takes head away just when there is water.", "Second.", RichText.Bold("Third") + " with emphasis."));
        b.Add(new CalloutBlock(CalloutKind.Caution, "Velocity above the usual range", "At design flow the water runs at 4.2 m/s; usual are 1 to 3 m/s.", b.Cite(Book, "p. 12")));
        b.Add(new CalloutBlock(CalloutKind.Serious, "", "Something that may stop the scheme.", RichText.Empty));
        b.Part("A picture", "part");
        b.Figure("fig-line", Line(), "A line that rises, and a label on it.");
        b.Section("A long table", "long");
        b.Table("tab-long", "Flow classes and what becomes of them.",
        [
            new("Class", ColumnAlign.Right), new(RichText.Formula("Q, m^3/s", bold: true), ColumnAlign.Right), new(RichText.Formula("H_n, m", bold: true), ColumnAlign.Right), new("Remark", Share: 3),
        ],
        [
            .. Enumerable.Range(1, rows).Select(i => new TableRow([Text(i), Text(i * 7), Text(i * 13), i % 9 == 0 ? "A remark that is long enough to be broken over two lines in its narrow cell." : "–"], i == 5 ? RowKind.Chosen : RowKind.Plain)),
            new TableRow(["All", "1", "2", ""], RowKind.Total),
        ], "A note below the table.");
        b.Section("After the table", "after");
        b.Say("The text goes on.");
        b.Appendix("Sources", "sources", onNewPage: true);
        b.Add(new ListBlock([.. b.Sources.Select(s => RichText.Of(s.ToString()))], [.. b.Sources.Select((_, i) => "[" + Text(i + 1) + "]")], [.. b.Sources.Select((_, i) => MemoBuilder.SourceAnchor(i + 1))]));
        return new MemoDocument(title, "Pre-feasibility of a canal drop", "N. N.", "en", new DateOnly(2026, 3, 1), paper, title + ": pre-feasibility", "Revision B", "2026-03-01", b.Finish());
    }

    public static Drawing Line()
    {
        var r = new DrawingRecorder();
        r.Rectangle(new Point(40, 10), 420, 180, new Paint(new Fill(InkRole.WaterFill, 0.4), new Stroke(InkRole.Line)));
        r.Polygon([new(40, 190), new(200, 120), new(460, 190)], Paint.Filled(InkRole.Ground));
        r.Polyline([new(40, 190), new(200, 120), new(460, 20)], new Stroke(InkRole.Water, 2));
        r.Line(new Point(40, 60), new Point(460, 60), new Stroke(InkRole.Ochre, 1.2, Dash.Dashed));
        r.Circle(new Point(200, 120), 4, new Paint(new Fill(InkRole.Card), new Stroke(InkRole.Water, 2)));
        r.Text(new Point(210, 118), "here: 10⁻⁵", new TextStyle(InkRole.Ink, 8.5, Weight: TextWeight.SemiBold, Halo: true));
        r.Text(new Point(250, 208), "Time, h", new TextStyle(InkRole.Soft, 8, TextAnchor.Middle));
        r.Text(new Point(26, 100), "Level, m", new TextStyle(InkRole.Soft, 8, TextAnchor.Middle, RotationDeg: -90));
        return r.Finish("A line", "It rises from 0 to 10 m in 4 hours.", 480, 215);
    }

    private static string Text(int number) => number.ToString(CultureInfo.InvariantCulture);
}

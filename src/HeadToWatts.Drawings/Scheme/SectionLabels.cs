using System.Globalization;
using HeadToWatts.Basis.Units;
using HeadToWatts.Drawings.Canvas;
using HeadToWatts.Drawings.Layout;

namespace HeadToWatts.Drawings.Scheme;

/// <summary>The labels of the section, the answers first so that they get the best places.</summary>
internal static class SectionLabels
{
    private static readonly double[] Shares = [0.5, 0.4, 0.6, 0.3, 0.7];

    public static void Draw(
        ICanvas canvas, LabelPlacer labels, SchemeSectionInput input, SectionLayout at, PipeOutline pipe, IReadOnlyList<Point> energy, IReadOnlyList<Point> hydraulic, UnitDisplay show, TypeScale type)
    {
        var strong = new TextStyle(InkRole.Ink, type.Strong, Weight: TextWeight.SemiBold, Halo: true);
        var quiet = new TextStyle(InkRole.Soft, type.Label, Halo: true);
        var machineEnergyY = at.Y(input.EnergyAtMachineM);

        Dimensioned(SectionLayout.GrossText(input, show), at.GrossX, at.HeadwaterY, at.TailwaterY, strong);
        if (input.NetHeadM > 0)
            Dimensioned("net head " + show.Length(input.NetHeadM), at.NetX, machineEnergyY, at.TailwaterY, strong);
        if (input.GrossHeadM > 0 && input.LossM > 0.0005 * input.GrossHeadM)
            Losses();

        Headwater();
        Tailwater();
        Machine();
        if (energy.Count > 2)
            labels.TryPlace(canvas, "energy grade line", quiet with { Role = InkRole.Ochre }, Along(energy, above: true), type.Label);
        if (hydraulic.Count > 1)
            labels.TryPlace(canvas, "hydraulic grade line", quiet with { Role = InkRole.Water }, Along(hydraulic, above: false), type.Label * 2);
        for (var i = 0; i < pipe.Centres.Count; i++)
            PipeLabel(input.Pipes[i], pipe.Centres[i]);

        void Dimensioned(string text, double x, double top, double bottom, TextStyle style)
        {
            var middle = (top + bottom) / 2;
            var level = Shares.SelectMany(share =>
            {
                var y = top + (share * (bottom - top)) + (style.Size * 0.35);
                return new LabelSpot[] { new(new Point(x + 7, y)), new(new Point(x - 7, y), TextAnchor.End) };
            });
            LabelSpot[] turned = [new(new Point(x + (style.Size * 1.15), middle), TextAnchor.Middle, -90), new(new Point(x - (style.Size * 0.55), middle), TextAnchor.Middle, -90)];
            labels.TryPlace(canvas, text, style, at.IsWide ? level.Concat(turned) : turned.Concat(level));
        }

        void Losses()
        {
            var text = "losses " + Loss(input, show);
            var style = strong with { Role = InkRole.Ochre };
            var gap = machineEnergyY - at.HeadwaterY;
            var spots = new List<LabelSpot>();
            if (gap > type.Strong * 1.25)
                spots.Add(new(new Point(at.NetX + 7, at.HeadwaterY + (gap / 2) + (type.Strong * 0.35))));
            spots.Add(new(new Point(at.NetX, at.HeadwaterY - 7), TextAnchor.Middle));
            spots.Add(new(new Point(at.GrossX, at.HeadwaterY - 7), TextAnchor.End));
            spots.Add(new(new Point(at.NetX + 4, at.HeadwaterY - 7), TextAnchor.End));
            spots.Add(new(new Point(at.Right + 10, at.HeadwaterY - 7), TextAnchor.End));
            spots.Add(new(new Point(at.NetX - 6, machineEnergyY + (type.Strong * 1.2)), TextAnchor.End));
            labels.TryPlace(canvas, text, style, spots);
        }

        void Headwater()
        {
            foreach (var text in input.LevelsAreKnown ? [SectionLayout.HeadwaterText(input, show), Level(input.HeadwaterM, show)] : new[] { "headwater" })
            {
                if (labels.TryPlace(canvas, text, quiet, [new(new Point(at.Left + 4, at.HeadwaterY - 7)), new(new Point(at.Left, at.HeadwaterY - 7))], 1))
                    return;
            }
        }

        void Tailwater()
        {
            var inWater = new TextStyle(InkRole.Soft, type.Label);
            string[] texts = input.LevelsAreKnown ? ["tailwater " + Level(input.TailwaterM, show), Level(input.TailwaterM, show)] : ["tailwater"];
            foreach (var text in texts)
            {
                var y = at.TailwaterY + (type.Label * 1.25);
                if (labels.TryPlace(canvas, text, inWater, [new(new Point(at.GrossX - 2, y), TextAnchor.End), new(new Point(at.Right, y), TextAnchor.End)]))
                    return;
            }
        }

        void Machine()
        {
            var power = input.MeterPowerKw > 0 ? UnitDisplay.Power(input.MeterPowerKw) : "stands";
            var roof = at.MachineY - (at.HouseHalf * 2.25) - 6;
            foreach (var text in new[] { input.Machine + ", " + power, power })
            {
                if (labels.TryPlace(canvas, text, quiet with { Role = InkRole.Ink, Halo = false }, [
                    new(new Point(at.MachineX, roof), TextAnchor.Middle),
                    new(new Point(at.HouseRight, roof), TextAnchor.End),
                    new(new Point(at.HouseRight, roof - 8), TextAnchor.End),
                    new(new Point(at.MachineX - at.HouseHalf - 5, at.MachineY - at.HouseHalf), TextAnchor.End),
                    new(new Point(at.MachineX, roof - 16), TextAnchor.Middle),
                    new(new Point(at.MachineX, at.TailwaterY + 13 + (type.Label * 1.3)), TextAnchor.Middle)], type.Label * 2))
                {
                    return;
                }
            }
        }

        IEnumerable<LabelSpot> Along(IReadOnlyList<Point> line, bool above)
        {
            foreach (var lift in above ? new[] { -5.0, -12 } : [type.Label * 1.15, type.Label * 1.8])
            {
                foreach (var share in new[] { 0.35, 0.5, 0.25, 0.65, 0.75 })
                {
                    var x = at.IntakeX + (share * (at.MachineX - at.IntakeX));
                    var slope = Slope(line, x);
                    yield return new LabelSpot(new Point(x, Spots.HeightAt(line, x) + lift), TextAnchor.Middle, slope);
                }
            }
        }

        void PipeLabel(SectionPipe part, (Point From, Point To, double HalfThickness) centre)
        {
            var (dx, dy) = (centre.To.X - centre.From.X, centre.To.Y - centre.From.Y);
            var length = Math.Sqrt((dx * dx) + (dy * dy));
            var turn = Math.Atan2(dy, dx) * 180 / Math.PI;
            var (nx, ny) = (-dy / length, dx / length);
            var inGround = quiet with { Halo = false };
            var bore = $"{Wording.Trimmed(show.Length(part.LengthM))} × {Wording.Trimmed(show.Diameter(part.InsideDiameterM))}";
            var velocity = show.Velocity(part.VelocityMPerS);
            string[] texts =
            [
                $"{part.Name} {bore}, {velocity}",
                $"{bore}, {velocity}",
                $"{Wording.Trimmed(show.Diameter(part.InsideDiameterM))}, {velocity}",
                Wording.Trimmed(show.Diameter(part.InsideDiameterM)),
            ];
            // A shorter label close to its pipe says more than a longer one far off.
            foreach (var away in new[] { 1.3, 2.4 })
            {
                foreach (var text in texts)
                {
                    var fits = TextMeasure.Width(text, inGround) <= length * 0.95 || text == texts[^1];
                    if (fits && labels.TryPlace(canvas, text, inGround, Beneath(centre.HalfThickness + (type.Label * away)), 1))
                        return;
                }
            }

            IEnumerable<LabelSpot> Beneath(double distance)
            {
                foreach (var share in new[] { 0.5, 0.42, 0.58, 0.35, 0.65 })
                    yield return new LabelSpot(new Point(centre.From.X + (share * dx) + (nx * distance), centre.From.Y + (share * dy) + (ny * distance)), TextAnchor.Middle, turn);
            }
        }

        static double Slope(IReadOnlyList<Point> line, double x)
        {
            for (var i = 1; i < line.Count; i++)
            {
                if (x <= line[i].X && line[i].X - line[i - 1].X > 1)
                    return Math.Atan2(line[i].Y - line[i - 1].Y, line[i].X - line[i - 1].X) * 180 / Math.PI;
            }

            return 0;
        }
    }

    /// <summary>The losses to the decimals of the gross head, so that the three heads add up as printed.</summary>
    public static string Loss(SchemeSectionInput input, UnitDisplay show)
    {
        var gross = UnitDisplay.In(input.GrossHeadM, show.LengthUnit);
        var point = gross.IndexOf('.', StringComparison.Ordinal);
        var decimals = point < 0 ? 0 : gross.Length - point - 1;
        var loss = Math.Max(0, show.LengthUnit.FromHeld(input.LossM));
        var rounded = Math.Round(loss, decimals, MidpointRounding.AwayFromZero);
        var text = rounded > 0 || loss == 0 ? rounded.ToString("F" + decimals.ToString(CultureInfo.InvariantCulture), CultureInfo.InvariantCulture) : UnitDisplay.Number(loss, 1);
        return text + " " + show.LengthUnit.Symbol;
    }

    /// <summary>A level with one digit more than a length has, since levels are compared by their difference.</summary>
    public static string Level(double levelM, UnitDisplay show)
    {
        var value = Math.Abs(show.LengthUnit.FromHeld(levelM));
        var digits = value >= 100 ? (int)Math.Floor(Math.Log10(value)) + 2 : 3;
        return UnitDisplay.In(levelM, show.LengthUnit, digits) + " " + show.LengthUnit.Symbol;
    }
}

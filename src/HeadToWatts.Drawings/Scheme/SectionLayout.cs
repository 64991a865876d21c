using HeadToWatts.Basis.Units;
using HeadToWatts.Drawings.Axes;
using HeadToWatts.Drawings.Canvas;
using HeadToWatts.Drawings.Layout;

namespace HeadToWatts.Drawings.Scheme;

/// <summary>
/// Scales and places of the section. Heights and distances have a scale each; their ratio is a round number that is stated.
/// The layout depends on levels and lengths only, so that the picture stands still while the flow moves.
/// </summary>
internal sealed class SectionLayout
{
    private static readonly double[] RoundRatios = [1, 1.2, 1.5, 1.8, 2, 2.5, 3, 3.5, 4, 4.5, 5, 6, 7, 8, 9];

    private readonly SchemeSectionInput _input;
    private readonly double _topY;
    private readonly double[] _stationM;
    private readonly double[] _acrossM;

    public SectionLayout(SchemeSectionInput input, UnitDisplay show, DrawingSize size)
    {
        _input = input;
        var type = size.Type;
        IsWide = size.Width >= 600;
        Top = type.Label * 1.9;
        Bottom = size.Height - (type.Tick * 1.6) - (type.Label * 1.45);
        Left = TextMeasure.Width(Ticks.Text(show.LengthUnit.FromHeld(input.HeadwaterM), 1), type.Tick) + (type.Tick * 0.9) + 12;
        Right = size.Width - (IsWide ? TextMeasure.Width(GrossText(input, show), type.Strong, TextWeight.SemiBold) + 12 : type.Strong * 1.7);
        HouseHalf = IsWide ? 22 : 16;

        var plot = Right - Left;
        var pool = IsWide ? TextMeasure.Width(HeadwaterText(input, show), type.Label) + 34 : Math.Clamp(plot * 0.14, 44, 104);
        var tail = IsWide ? (HouseHalf * 2) + 30 + TextMeasure.Width("net head 000.0 ft", type.Strong, TextWeight.SemiBold) : (HouseHalf * 2) + (type.Strong * 4.2);
        var run = plot - pool - tail;
        (_stationM, _acrossM) = Across(input);
        var runM = _acrossM[^1];

        var head = Math.Max(input.TopM - input.FootM, 1e-6);
        var topY = Top + (type.Label * 2);
        var highest = (Bottom - topY - Math.Max(type.Label * 3, 34)) / head;
        if (runM <= 0)
        {
            HeightRatio = 1;
            VerticalScale = highest;
            HorizontalScale = 0;
            run = Math.Max(64, plot * 0.13);
            pool = (plot - run - tail) * 0.75;
        }
        else
        {
            var widest = run / runM;
            HeightRatio = RoundBelow(highest / widest);
            HorizontalScale = Math.Min(widest, highest / HeightRatio);
            VerticalScale = HorizontalScale * HeightRatio;
            var spare = run - (runM * HorizontalScale);
            run -= spare;
            pool += spare * 0.5;
        }

        IntakeX = Left + pool;
        MachineX = IntakeX + run;
        _topY = topY;
    }

    public bool IsWide { get; }

    public double Left { get; }

    public double Top { get; }

    public double Right { get; }

    public double Bottom { get; }

    public double IntakeX { get; }

    public double MachineX { get; }

    public double HeadwaterY => Y(_input.HeadwaterM);

    public double HouseHalf { get; }

    /// <summary>How many times larger heights are drawn than distances.</summary>
    public double HeightRatio { get; }

    public double VerticalScale { get; }

    public double HorizontalScale { get; }

    public bool HasRun => HorizontalScale > 0;

    public double RunM => _acrossM[^1];

    public double TailwaterY => Y(_input.TailwaterM);

    public double HouseRight => MachineX + HouseHalf;

    public double GrossX => Right - 3;

    public double NetX => IsWide ? HouseRight + 24 : HouseRight + 14;

    /// <summary>Level of the machine's centre on the drawing, kept clear of the tailwater line.</summary>
    public double MachineY => _input.Grades.Count > 0 ? Math.Min(Y(_input.Grades[^1].CentreLevelM), TailwaterY - 6) : TailwaterY - 14;

    public static string GrossText(SchemeSectionInput input, UnitDisplay show) => "gross head " + show.Length(input.GrossHeadM);

    public static string HeadwaterText(SchemeSectionInput input, UnitDisplay show) =>
        input.LevelsAreKnown ? "headwater " + SectionLabels.Level(input.HeadwaterM, show) : "headwater";

    public double Y(double levelM) => _topY + ((_input.TopM - levelM) * VerticalScale);

    public double X(double stationM)
    {
        for (var i = 1; i < _stationM.Length; i++)
        {
            if (stationM > _stationM[i])
                continue;
            var length = _stationM[i] - _stationM[i - 1];
            var share = length > 0 ? (stationM - _stationM[i - 1]) / length : 1;
            return IntakeX + ((_acrossM[i - 1] + (share * (_acrossM[i] - _acrossM[i - 1]))) * HorizontalScale);
        }

        return MachineX;
    }

    public double XOfDistance(double acrossM) => IntakeX + (acrossM * HorizontalScale);

    // The horizontal distance of a pipe is shorter than its length; a pipe that falls by its whole length still needs room.
    private static (double[] StationM, double[] AcrossM) Across(SchemeSectionInput input)
    {
        var stations = new double[input.Pipes.Count + 1];
        var across = new double[input.Pipes.Count + 1];
        for (var i = 0; i < input.Pipes.Count; i++)
        {
            var length = input.Pipes[i].LengthM;
            var fall = input.Grades[2 * i].CentreLevelM - input.Grades[(2 * i) + 1].CentreLevelM;
            var flat = Math.Sqrt(Math.Max((length * length) - (fall * fall), 0.04 * length * length));
            stations[i + 1] = stations[i] + length;
            across[i + 1] = across[i] + flat;
        }

        return (stations, across);
    }

    private static double RoundBelow(double ratio)
    {
        if (ratio <= 1)
            return 1;
        var power = Math.Pow(10, Math.Floor(Math.Log10(ratio) + 1e-9));
        var best = power;
        foreach (var step in RoundRatios)
        {
            if (step * power <= ratio * (1 + 1e-9))
                best = step * power;
        }

        return best;
    }
}

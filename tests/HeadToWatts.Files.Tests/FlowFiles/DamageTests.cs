using System.Text;
using HeadToWatts.Basis.Units;
using HeadToWatts.Files.FlowFiles;
using HeadToWatts.Files.FlowFiles.Recipes;
using HeadToWatts.FlowRecords;
using HeadToWatts.FlowRecords.Quality;
using HeadToWatts.FlowRecords.SubDaily;

namespace HeadToWatts.Files.Tests.FlowFiles;

/// <summary>
/// Ten thousand damaged variants of each sample: bytes changed, taken out and put in, files cut off, rows cut short. Each ends in a
/// record or in a list of problems; and where a row was cut, no day has another flow than before unless the report tells of it.
/// </summary>
public sealed class DamageTests
{
    private const int Variants = 10_000;

    private static readonly (string Name, string Text, FlowFileOptions Options)[] Samples =
    [
        ("daily.csv", "date,flow_m3/s\n2020-02-27,123.5\n2020-02-28,118\n2020-02-29,97.25\n2020-03-01,0\n2020-03-02,88\n", FlowFileOptions.Default),
        ("points.csv", "Datum;Abfluss (m3/s);flag\n27.02.2020;123,5;A\n28.02.2020;118,0;e\n29.02.2020;;A\n01.03.2020;88,0;A\n", FlowFileOptions.Default),
        ("reclamation.csv", "DateTime,abcd_qd,abcd_gd\n1/29/2020,1970,3.1\n1/30/2020,1870,3.2\n1/31/2020,-999,\n2/1/2020,1580,3\n", FlowFileOptions.Default),
        ("usgs.rdb", "# x\nagency_cd\tsite_no\tdatetime\t1_00060_00003\t1_00060_00003_cd\n5s\t15s\t20d\t14n\t10s\nUSGS\t09999999\t2020-01-02\t146.0\tA\nUSGS\t09999999\t2020-01-03\tIce\tA:e\nUSGS\t09999999\t2020-01-04\t152\tP\n", FlowFileOptions.Default),
        ("wsc.csv", "Daily Discharge (m3/s) (PARAM = 1)\r\n ID,PARAM,Date,Value,SYM\r\n99XX001,1,2020/01/01,5.03,B\r\n99XX001,1,2020/01/02,15.07,\r\n99XX001,2,2020/01/01,1.5,\r\n", FlowFileOptions.Default),
        ("nrfa.csv", NewFormatTests.Nrfa, FlowFileOptions.Default),
        ("grdc.txt", NewFormatTests.Grdc, FlowFileOptions.Default),
        ("france.json", NewFormatTests.France, FlowFileOptions.Default),
        ("instant.rdb", NewFormatTests.InstantHead + Instants(), new FlowFileOptions(SubDaily: new SubDailySettings(0.9, TimeSpan.FromHours(7)))),
        ("curve.csv", "exceeded_pct,flow_cfs\n0,80\n5,70\n50,35\n95,2.5\n", FlowFileOptions.Default),
        ("recipe.txt", "made by hand\nday flow code\n070227 123.5 A\n070228 118.0 A\n070301 n.a. A\n070302 88.5 A\n", new FlowFileOptions(Recipe: new ReadingRecipe { Separator = ReadingRecipe.Blanks, SkipRows = 1, HeaderRows = 1, DateOrder = RecipeDateOrder.YearMonthDay, TwoDigitYearsFrom = 1950, QualityColumn = "code", MissingMarks = ["n.a."], Unit = UnitTable.LitrePerSecond })),
    ];

    public static TheoryData<int> All => [.. Enumerable.Range(0, Samples.Length)];

    [Theory]
    [MemberData(nameof(All))]
    public void Damaged_files_end_in_a_record_or_in_problems_and_a_cut_row_is_never_read_as_another_flow(int sample)
    {
        var (name, text, options) = Samples[sample];
        var whole = FlowFileReader.ReadText(name, text, options);
        Assert.True(whole.IsGood, name + ": " + (whole.IsGood ? "" : whole.Problems[0]));
        var bytes = Encoding.UTF8.GetBytes(text);
        var random = new Random(20_201_101 + sample);
        for (var i = 0; i < Variants; i++)
        {
            var kind = i % 4;
            var damaged = kind switch { 0 => bytes[..random.Next(bytes.Length)], 1 => RowCut(bytes, random), _ => Edited(bytes, random) };
            using var stream = new MemoryStream(damaged);
            var read = FlowFileReader.Read(name, stream, options);
            Damage.Survives(read);
            if (kind < 2 && read.IsGood && read.Value.Record is not null)
                NothingInvented(whole.Value.Record!, read.Value, name, damaged);
        }
    }

    [SkippableFact]
    public void Damaged_pieces_of_real_files_end_in_a_record_or_in_problems()
    {
        foreach (var path in Directory.EnumerateFiles(Path.GetDirectoryName(ReferenceFlows.PathOf("oracle.csv"))!).Order(StringComparer.Ordinal))
        {
            var name = Path.GetFileName(path);
            var bytes = File.ReadAllBytes(path);
            bytes = bytes[..Math.Min(bytes.Length, name.EndsWith(".rdb", StringComparison.Ordinal) ? 2600 : 700)];
            var random = new Random(name.Length);
            for (var i = 0; i < 1000; i++)
            {
                using var stream = new MemoryStream(i % 2 == 0 ? Edited(bytes, random) : RowCut(bytes, random));
                Damage.Survives(FlowFileReader.Read(name, stream, new FlowFileOptions(UnitTable.CubicFootPerSecond, DateOrder.MonthFirst)));
            }
        }
    }

    private static string Instants()
    {
        var rows = new StringBuilder();
        for (var i = 0; i <= 8; i++)
            rows.Append(System.Globalization.CultureInfo.InvariantCulture, $"USGS\t09999999\t{new DateTime(2020, 7, 1, 0, 0, 0, DateTimeKind.Unspecified).AddHours(6 * i):yyyy-MM-dd HH:mm}\tEDT\t{100 + i}\tP\n");
        return rows.ToString();
    }

    // From within a row to its end: what is left of it joins the next row. A row that is taken out whole leaves nothing to see.
    private static byte[] RowCut(byte[] bytes, Random random)
    {
        var from = random.Next(1, bytes.Length);
        while (from < bytes.Length && bytes[from - 1] == '\n')
            from++;
        var end = Array.IndexOf(bytes, (byte)'\n', Math.Min(from, bytes.Length - 1));
        return end < 0 ? bytes[..from] : [.. bytes[..from], .. bytes[(end + 1)..]];
    }

    private static byte[] Edited(byte[] bytes, Random random)
    {
        var list = bytes.ToList();
        for (var hits = random.Next(1, 8); hits > 0 && list.Count > 0; hits--)
        {
            var at = random.Next(list.Count);
            switch (random.Next(4))
            {
                case 0:
                    list[at] = (byte)random.Next(256);
                    break;
                case 1:
                    list.Insert(at, (byte)"0123456789,;\t-./:\"\n#% eE<"[random.Next(25)]);
                    break;
                case 2:
                    list.RemoveRange(at, Math.Min(list.Count - at, random.Next(1, 12)));
                    break;
                default:
                    list.InsertRange(at, list.GetRange(at, Math.Min(list.Count - at, random.Next(1, 40))));
                    break;
            }
        }

        return [.. list];
    }

    private static void NothingInvented(DailyRecord whole, FlowFile read, string name, byte[] damaged)
    {
        var record = read.Record!;
        var told = read.Report.Quality!.Findings.Any(f => f.Kind is QualityKind.CutRow or QualityKind.OpenEnd or QualityKind.ShortRow or QualityKind.LongRow or QualityKind.OutOfOrder or QualityKind.OtherExtent)
            || read.Report.AbsentDays > 0;
        for (var i = 0; i < record.DayCount; i++)
        {
            if (double.IsNaN(record.Flows[i]))
                continue;
            var at = record.DateOf(i).DayNumber - whole.FirstDay.DayNumber;
            var same = at >= 0 && at < whole.DayCount && Math.Abs(whole.Flows[at] - record.Flows[i]) <= 1e-12 * Math.Abs(record.Flows[i]);
            Assert.True(same || told, $"{name}: {record.DateOf(i):O} {record.Flows[i]:R} in\n{Encoding.UTF8.GetString(damaged)}");
        }
    }
}

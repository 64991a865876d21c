using System.Globalization;
using System.Text;
using BenchmarkDotNet.Attributes;
using CsvHelper;
using HeadToWatts.Files.FlowFiles;

namespace HeadToWatts.Benchmarks;

/// <summary>Reading of a million rows of 15-minute flows, beside a bare loop of the CSV library that only sums the second column.</summary>
[MemoryDiagnoser]
public class FlowReadingBenchmarks
{
    private const int Rows = 1_000_000;
    private byte[] _quarterHours = [];
    private byte[] _days = [];

    /// <summary>Makes the files in memory.</summary>
    [GlobalSetup]
    public void Make()
    {
        var text = new StringBuilder("time,flow_cfs\n", Rows * 24);
        var start = new DateTime(1992, 1, 1, 0, 0, 0, DateTimeKind.Unspecified);
        for (var i = 0; i < Rows; i++)
            text.Append(CultureInfo.InvariantCulture, $"{start.AddMinutes(15 * i):yyyy-MM-dd HH:mm},{100 + (i * 37 % 901) / 10.0:0.0}\n");
        _quarterHours = Encoding.UTF8.GetBytes(text.ToString());
        text.Clear().Append("date,flow_cfs\n");
        for (var i = 0; i < 36_525; i++)
            text.Append(CultureInfo.InvariantCulture, $"{new DateOnly(1900, 1, 1).AddDays(i):yyyy-MM-dd},{100 + (i * 37 % 901) / 10.0:0.0}\n");
        _days = Encoding.UTF8.GetBytes(text.ToString());
    }

    /// <summary>A million rows to daily means, with their quality.</summary>
    [Benchmark]
    public int QuarterHours() => FlowFileReader.Read("a.csv", new MemoryStream(_quarterHours), FlowFileOptions.Default).Value.Report.Valid;

    /// <summary>A hundred years of days, with their quality.</summary>
    [Benchmark]
    public int Days() => FlowFileReader.Read("a.csv", new MemoryStream(_days), FlowFileOptions.Default).Value.Report.Valid;

    /// <summary>The library alone over the million rows.</summary>
    [Benchmark(Baseline = true)]
    public double BareLoop()
    {
        using var csv = CsvReader.Create(new MemoryStream(_quarterHours), new CsvReaderOptions { Separator = ',', FormatProvider = CultureInfo.InvariantCulture });
        var sum = 0.0;
        while (csv.Read())
        {
            if (csv.TryParse<double>(1, out var flow))
                sum += flow;
        }

        return sum;
    }
}

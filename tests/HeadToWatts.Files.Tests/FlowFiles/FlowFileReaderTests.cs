using System.Text;
using CsCheck;
using HeadToWatts.Files.FlowFiles;

namespace HeadToWatts.Files.Tests.FlowFiles;

public sealed class FlowFileReaderTests
{
    private static readonly string[] Samples =
    [
        "exceeded_pct,flow_cfs\n0,80\n5,70\n50,35\n95,2.5\n",
        "date,flow_cfs\n2020-02-28,10\n2020-02-29,20\n2020-03-01,0\n",
        "DateTime,abcd_qd\n1/31/2020,50\n2/1/2020,-999\n2/2/2020,52\n",
        "ID,PARAM,Date,Value,SYM\n99XX001,1,2020/01/01,5.0,B\n99XX001,2,2020/01/02,1,\n",
        "# x\nagency_cd\tsite_no\tdatetime\t1_00060_00003\t1_00060_00003_cd\n5s\t15s\t20d\t14n\t10s\nUSGS\t09999999\t2020-01-02\t6.0\tA\n",
    ];

    [Fact]
    public void Keys_of_formats_are_unique_and_found()
    {
        Assert.Equal(FlowFileFormats.All.Count, FlowFileFormats.All.Select(f => f.Id).Distinct().Count());
        Assert.All(FlowFileFormats.All, f => Assert.Same(f, FlowFileFormats.Find(f.Id.ToUpperInvariant())));
        var named = typeof(FlowFileFormats).Assembly.GetTypes().Where(t => t.IsClass && typeof(IFlowFileFormat).IsAssignableFrom(t));
        Assert.Equal(named.Count(), FlowFileFormats.All.Count);
    }

    [Fact]
    public void Damaged_text_is_read_or_refused_and_never_breaks()
    {
        var edits = Gen.Select(Gen.Int[0, 300], Gen.Int[0, 3], Gen.OneOf(Gen.Char["0123456789,;\t-./\"\n#% eE<"], Gen.Char));
        Gen.Select(Gen.Int[0, Samples.Length - 1], edits.Array[0, 12], Gen.Int[-1, FlowFileFormats.All.Count - 1]).Sample((sample, list, format) =>
        {
            var text = new StringBuilder(Samples[sample]);
            foreach (var (at, kind, c) in list)
            {
                var i = Math.Min(at, Math.Max(0, text.Length - 1));
                if (kind == 0 && text.Length > 0)
                    text.Remove(i, 1);
                else if (kind == 1)
                    text.Insert(Math.Min(i, text.Length), c);
                else if (kind == 2 && text.Length > 0)
                    text[i] = c;
                else if (text.Length > 0)
                    text.Remove(i, Math.Min(text.Length - i, at % 17));
            }

            Damage.Survives(FlowFileReader.ReadText("x", text.ToString(), new FlowFileOptions(Format: format < 0 ? null : FlowFileFormats.All[format].Id)));
        }, iter: 3000);
    }

    [Theory]
    [InlineData("", "empty")]
    [InlineData("PK\u0003\u0004abc", "save the sheet as CSV")]
    [InlineData("%PDF-1.7", "PDF")]
    [InlineData("ab\0cd", "not a text file")]
    [InlineData("hello world\nthis is a letter\n", "not a kind of flow file")]
    public void What_is_no_flow_file_is_named_for_what_it_is(string text, string why)
    {
        Assert.Contains(why, Assert.Single(FlowFileReader.ReadText("x", text, FlowFileOptions.Default).Problems).Why, StringComparison.Ordinal);
    }

    [Fact]
    public void An_unknown_format_is_refused_with_the_known_ones()
    {
        Assert.Contains("usgs-rdb", Assert.Single(FlowFileReader.ReadText("x", "a", new FlowFileOptions(Format: "zzz")).Problems).Accepted, StringComparison.Ordinal);
    }

    [Fact]
    public async Task A_file_above_64_MB_is_refused_by_name_whether_its_length_is_known_or_not()
    {
        var problem = Assert.Single(FlowFileReader.Read("big.csv", new Endless(seekable: true), FlowFileOptions.Default).Problems);
        Assert.Equal("big.csv", problem.Where);
        Assert.Contains("64 MB", problem.Accepted, StringComparison.Ordinal);
        Assert.Equal(problem, Assert.Single(FlowFileReader.Read("big.csv", new Endless(seekable: false), FlowFileOptions.Default).Problems));
        Assert.Equal(problem, Assert.Single((await FlowFileReader.ReadAsync("big.csv", new Endless(seekable: false), FlowFileOptions.Default)).Problems));
    }

    [Fact]
    public async Task A_stream_that_arrives_in_pieces_gives_the_same()
    {
        using var stream = new MemoryStream(Encoding.Unicode.GetPreamble().Concat(Encoding.Unicode.GetBytes(Samples[1])).ToArray());
        Assert.Equal(3, (await FlowFileReader.ReadAsync("utf16.csv", stream, FlowFileOptions.Default)).Value.Record!.DayCount);
    }

    [Fact]
    public void Reading_can_be_stopped()
    {
        using var stream = new MemoryStream(Encoding.UTF8.GetBytes(Samples[1]));
        Assert.Throws<OperationCanceledException>(() => FlowFileReader.Read("x", stream, FlowFileOptions.Default, new CancellationToken(canceled: true)));
    }

    private sealed class Endless(bool seekable) : Stream
    {
        public override bool CanRead => true;

        public override bool CanSeek => seekable;

        public override bool CanWrite => false;

        public override long Length => FlowFileSource.LargestBytes + 1;

        public override long Position { get; set; }

        public override int Read(byte[] buffer, int offset, int count)
        {
            Array.Fill(buffer, (byte)'1', offset, count);
            return count;
        }

        public override void Flush()
        {
        }

        public override long Seek(long offset, SeekOrigin origin) => throw new NotSupportedException();

        public override void SetLength(long value) => throw new NotSupportedException();

        public override void Write(byte[] buffer, int offset, int count) => throw new NotSupportedException();
    }
}

using System.Text;
using HeadToWatts.Basis.Problems;
using HeadToWatts.Files.FlowFiles.Reading;

namespace HeadToWatts.Files.FlowFiles;

/// <summary>The bytes of a flow file, held so that they can be read more than once.</summary>
public sealed class FlowFileSource
{
    /// <summary>Largest file that is read: 64 MB.</summary>
    public const long LargestBytes = 64L * 1024 * 1024;

    private const int ChunkBytes = 256 * 1024;
    private readonly List<ArraySegment<byte>> _chunks;
    private readonly Encoding _encoding;
    private FlowFileHead? _head;

    private FlowFileSource(string name, List<ArraySegment<byte>> chunks)
    {
        Name = name;
        _chunks = chunks;
        Bytes = chunks.Sum(c => (long)c.Count);
        Meter = new ReadingMeter(Bytes);
        var first = FirstBytes;
        IsWide = first.StartsWith<byte>([0xFF, 0xFE]) || first.StartsWith<byte>([0xFE, 0xFF]);
        IsWestern = !IsWide && chunks.Count > 0 && !IsUtf8(chunks[0]);
        _encoding = IsWestern ? Encoding.Latin1 : Encoding.UTF8;
        EndsInsideRow = chunks.Count > 0 && chunks[^1][chunks[^1].Count - 1] is not ((byte)'\n' or (byte)'\r');
    }

    /// <summary>Name of the file, as problems give it.</summary>
    public string Name { get; }

    /// <summary>Holds a stream; one above the limit is refused by name.</summary>
    public static Checked<FlowFileSource> Hold(string name, Stream stream)
    {
        ArgumentNullException.ThrowIfNull(stream);
        if (stream.CanSeek && stream.Length - stream.Position > LargestBytes)
            return TooLarge(name);
        var chunks = new List<ArraySegment<byte>>();
        long total = 0;

        // A small file takes no more than it needs; one byte of room shows its end.
        var size = stream.CanSeek ? (int)Math.Min(ChunkBytes, stream.Length - stream.Position + 1) : ChunkBytes;
        while (true)
        {
            var chunk = new byte[size];
            var read = stream.ReadAtLeast(chunk, size, throwOnEndOfStream: false);
            total += read;
            if (total > LargestBytes)
                return TooLarge(name);
            if (read > 0)
                chunks.Add(new ArraySegment<byte>(chunk, 0, read));
            if (read < size)
                return Checked.Of(new FlowFileSource(name, chunks));
        }
    }

    /// <summary>Holds a stream that can only be read without blocking; one above the limit is refused by name.</summary>
    public static Task<Checked<FlowFileSource>> HoldAsync(string name, Stream stream, CancellationToken cancellation = default) => HoldAsync(name, stream, null, cancellation);

    /// <summary>Holds a stream that can only be read without blocking, and tells how far it is.</summary>
    /// <param name="name">Name of the file.</param>
    /// <param name="stream">The stream.</param>
    /// <param name="bytesSoFar">Told how many bytes have come.</param>
    /// <param name="cancellation">Stops the reading.</param>
    public static async Task<Checked<FlowFileSource>> HoldAsync(string name, Stream stream, IProgress<long>? bytesSoFar, CancellationToken cancellation)
    {
        ArgumentNullException.ThrowIfNull(stream);
        var chunks = new List<ArraySegment<byte>>();
        long total = 0;
        while (true)
        {
            var chunk = new byte[ChunkBytes];
            var read = await stream.ReadAtLeastAsync(chunk, ChunkBytes, throwOnEndOfStream: false, cancellation).ConfigureAwait(false);
            total += read;
            bytesSoFar?.Report(total);
            if (total > LargestBytes)
                return TooLarge(name);
            if (read > 0)
                chunks.Add(new ArraySegment<byte>(chunk, 0, read));
            if (read < ChunkBytes)
                return Checked.Of(new FlowFileSource(name, chunks));
        }
    }

    /// <summary>How many bytes there are.</summary>
    public long Bytes { get; }

    /// <summary>Whether the last byte is not a line end, so that the last row may be cut.</summary>
    public bool EndsInsideRow { get; }

    /// <summary>Whether the text is not UTF-8 and is read as Western European (ISO 8859-1).</summary>
    public bool IsWestern { get; }

    /// <summary>Opens the text from its beginning: UTF-8, or as a byte-order mark says, or Western European where it is not UTF-8.</summary>
    public TextReader OpenText() => new StreamReader(new ChunkStream(_chunks, Meter), _encoding, detectEncodingFromByteOrderMarks: true);

    internal ReadingMeter Meter { get; }

    /// <summary>The opening lines, found once.</summary>
    internal FlowFileHead Head => _head ??= FlowFileHead.Find(this);

    internal bool IsWide { get; }

    /// <summary>The bytes as UTF-8, without decoding; null where the text is written otherwise.</summary>
    internal Stream? OpenUtf8() => IsWide || IsWestern ? null : new ChunkStream(_chunks, Meter);

    /// <summary>Whether any byte is a given one; fast enough to ask of a whole file.</summary>
    internal bool Holds(byte wanted) => _chunks.Exists(c => c.AsSpan().Contains(wanted));

    /// <summary>The first bytes, for telling text from other files.</summary>
    internal ReadOnlySpan<byte> FirstBytes => _chunks.Count == 0 ? [] : _chunks[0].AsSpan(0, Math.Min(_chunks[0].Count, 4096));

    // A character may be cut at the end of the first piece; it is at most four bytes.
    private static bool IsUtf8(ReadOnlySpan<byte> bytes)
    {
        for (var cut = 0; cut <= Math.Min(3, bytes.Length); cut++)
        {
            if (System.Text.Unicode.Utf8.IsValid(bytes[..^cut]))
                return true;
        }

        return false;
    }

    private static Checked<FlowFileSource> TooLarge(string name) => Checked.Refused<FlowFileSource>(
        new Problem(name, "a file above 64 MB", "it is too large to be a record of daily flows", "a flow file of up to 64 MB"));
}

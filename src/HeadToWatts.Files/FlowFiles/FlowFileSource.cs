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

    private FlowFileSource(string name, List<ArraySegment<byte>> chunks)
    {
        Name = name;
        _chunks = chunks;
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
        while (true)
        {
            var chunk = new byte[ChunkBytes];
            var read = stream.ReadAtLeast(chunk, ChunkBytes, throwOnEndOfStream: false);
            total += read;
            if (total > LargestBytes)
                return TooLarge(name);
            if (read > 0)
                chunks.Add(new ArraySegment<byte>(chunk, 0, read));
            if (read < ChunkBytes)
                return Checked.Of(new FlowFileSource(name, chunks));
        }
    }

    /// <summary>Holds a stream that can only be read without blocking; one above the limit is refused by name.</summary>
    public static async Task<Checked<FlowFileSource>> HoldAsync(string name, Stream stream, CancellationToken cancellation = default)
    {
        ArgumentNullException.ThrowIfNull(stream);
        var chunks = new List<ArraySegment<byte>>();
        long total = 0;
        while (true)
        {
            var chunk = new byte[ChunkBytes];
            var read = await stream.ReadAtLeastAsync(chunk, ChunkBytes, throwOnEndOfStream: false, cancellation).ConfigureAwait(false);
            total += read;
            if (total > LargestBytes)
                return TooLarge(name);
            if (read > 0)
                chunks.Add(new ArraySegment<byte>(chunk, 0, read));
            if (read < ChunkBytes)
                return Checked.Of(new FlowFileSource(name, chunks));
        }
    }

    /// <summary>Opens the text from its beginning. UTF-8 unless a byte-order mark says otherwise.</summary>
    public TextReader OpenText() => new StreamReader(new ChunkStream(_chunks), Encoding.UTF8, detectEncodingFromByteOrderMarks: true);

    /// <summary>The first bytes, for telling text from other files.</summary>
    internal ReadOnlySpan<byte> FirstBytes => _chunks.Count == 0 ? [] : _chunks[0].AsSpan(0, Math.Min(_chunks[0].Count, 4096));

    private static Checked<FlowFileSource> TooLarge(string name) => Checked.Refused<FlowFileSource>(
        new Problem(name, "a file above 64 MB", "it is too large to be a record of daily flows", "a flow file of up to 64 MB"));
}

namespace HeadToWatts.Files.FlowFiles.Reading;

/// <summary>Reads pieces of memory as one stream, so that a large file is held once and never copied whole.</summary>
internal sealed class ChunkStream(IReadOnlyList<ArraySegment<byte>> chunks, ReadingMeter meter) : Stream
{
    private long _read;
    private int _chunk;
    private int _offset;

    public override bool CanRead => true;

    public override bool CanSeek => false;

    public override bool CanWrite => false;

    public override long Length => throw new NotSupportedException();

    public override long Position
    {
        get => throw new NotSupportedException();
        set => throw new NotSupportedException();
    }

    public override int Read(byte[] buffer, int offset, int count) => Read(buffer.AsSpan(offset, count));

    public override int Read(Span<byte> buffer)
    {
        while (_chunk < chunks.Count && _offset == chunks[_chunk].Count)
        {
            _chunk++;
            _offset = 0;
        }

        if (_chunk == chunks.Count)
            return 0;
        var take = Math.Min(buffer.Length, chunks[_chunk].Count - _offset);
        chunks[_chunk].AsSpan(_offset, take).CopyTo(buffer);
        _offset += take;
        _read += take;
        meter.Reached(_read);
        return take;
    }

    public override void Flush()
    {
    }

    public override long Seek(long offset, SeekOrigin origin) => throw new NotSupportedException();

    public override void SetLength(long value) => throw new NotSupportedException();

    public override void Write(byte[] buffer, int offset, int count) => throw new NotSupportedException();
}

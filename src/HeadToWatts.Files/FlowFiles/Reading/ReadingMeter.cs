namespace HeadToWatts.Files.FlowFiles.Reading;

/// <summary>Tells how far the reading of a file has come, by bytes. Only ever forward, in steps of a hundredth.</summary>
internal sealed class ReadingMeter(long totalBytes)
{
    private const double Step = 0.01;
    private double _told;
    private IProgress<double>? _progress;

    public void Start(IProgress<double>? progress)
    {
        _progress = progress;
        _told = 0;
    }

    public void Reached(long bytes)
    {
        if (_progress is null || totalBytes == 0)
            return;
        var share = Math.Min(1, (double)bytes / totalBytes);
        if (share < _told + Step)
            return;
        _told = share;
        _progress.Report(share);
    }

    public void Done()
    {
        if (_told < 1)
            _progress?.Report(1);
        _told = 1;
    }
}

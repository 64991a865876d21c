using HeadToWatts.Drawings;
using HeadToWatts.Drawings.Canvas;
using HeadToWatts.Files.Demonstrations;
using HeadToWatts.Files.StudyFiles;
using HeadToWatts.Studies;
using HeadToWatts.Studies.Cautions;

namespace HeadToWatts.Web.Hosting;

/// <summary>
/// Runs an example a number of times after the start, so that the code is compiled to its fast form before a visitor types:
/// the first keystrokes would otherwise be followed three times slower than the later ones. It gives way to visitors.
/// </summary>
internal sealed class WarmUp : BackgroundService
{
    // The runtime compiles a method anew after thirty calls.
    private const int Rounds = 40;

    protected override Task ExecuteAsync(CancellationToken stoppingToken)
    {
        var thread = new Thread(() => Run(stoppingToken)) { IsBackground = true, Priority = ThreadPriority.BelowNormal, Name = nameof(WarmUp) };
        thread.Start();
        return Task.CompletedTask;
    }

    private static void Run(CancellationToken stopping)
    {
        var document = DemoSites.All[0].Load();
        var sizes = Sessions.PictureSizes.Usual;
        for (var round = 0; round < Rounds && !stopping.IsCancellationRequested; round++)
        {
            if (!StudyBuilder.Build(document, NoFlowFiles.Instance).TryGet(out var input))
                return;
            var result = Study.Run(input.Header, input.Alternatives[0]);
            var show = result.Show();
            CautionRules.For(result, show);
            foreach (var drawing in new[]
            {
                SchemeSection.Draw(result, show, sizes.Wide), FlowDurationChart.Draw(result, show, sizes.Wide), LossShareChart.Draw(result, show, sizes.Half),
                EnvelopeChart.Draw(result, show, sizes.Half), PowerChart.Draw(result, show, sizes.Half), DesignFlowChart.Draw(result, show, sizes.Half),
            })
            {
                if (drawing is not null)
                    SvgWriter.Write(drawing, "warm-up");
            }

            // A short rest for whoever else wants the processor; the end of the program wakes it.
            if (stopping.WaitHandle.WaitOne(5))
                return;
        }
    }
}

using HeadToWatts.Basis.Problems;
using HeadToWatts.Basis.Units;
using HeadToWatts.Files.Demonstrations;
using HeadToWatts.Files.StudyFiles;
using HeadToWatts.Storage;
using HeadToWatts.Web.Sessions;
using Microsoft.AspNetCore.Components;
using Microsoft.AspNetCore.Components.Forms;
using Radzen;

namespace HeadToWatts.Web.Pages;

/// <summary>Where a visitor begins.</summary>
public sealed partial class StartPage
{
    private UnitSystem _units = UnitSystem.US;
    private string? _flow;
    private string? _head;
    private string? _length;
    private string? _diameter;
    private string _problemTitle = "";
    private IReadOnlyList<Problem> _problems = [];
    private IReadOnlyList<RecentStudy> _recent = [];

    /// <summary>The family of units chosen on an earlier visit.</summary>
    [CascadingParameter(Name = "InitialUnits")] public UnitSystem? InitialUnits { get; set; }

    private UnitOfMeasure FlowUnit => UnitDisplay.For(_units).FlowUnit;

    private UnitOfMeasure LengthUnit => UnitDisplay.For(_units).LengthUnit;

    private UnitOfMeasure DiameterUnit => UnitDisplay.For(_units).DiameterUnit;

    /// <inheritdoc/>
    protected override void OnInitialized()
    {
        _units = InitialUnits ?? UnitSystem.US;
        _recent = Store.Recent(12);
    }

    private void Begin() => Open(NewStudy.FromNumbers(_units, _flow, _head, _length, _diameter));

    private void OpenDemo(DemoSite site)
    {
        var document = site.Load();
        if (InitialUnits is not null || _units != UnitSystem.US)
            document.Units = _units.ToString();
        Open(document);
    }

    private async Task OpenFileAsync(InputFileChangeEventArgs chosen)
    {
        var file = chosen.File;
        _problems = [];
        try
        {
            if (file.Size > StudyFileReader.LargestBytes)
            {
                Refuse(file.Name, [new Problem(file.Name, $"{file.Size / 1048576.0:0.0} MB", "a study file is at most 1 MB", "long flow records as a file of their own")]);
                return;
            }

            using var bytes = new MemoryStream();
            await using (var stream = file.OpenReadStream(StudyFileReader.LargestBytes))
                await stream.CopyToAsync(bytes);
            bytes.Position = 0;
            var reading = StudyFileReader.Read(file.Name, bytes);
            if (reading.TryGet(out var document))
                Open(document);
            else
                Refuse(file.Name, reading.Problems);
        }
        catch (Exception e) when (e is IOException or InvalidOperationException or OperationCanceledException or Microsoft.JSInterop.JSException)
        {
            Refuse(file.Name, [new Problem(file.Name, "", "it could not be read: " + e.Message)]);
        }
    }

    private async Task RemoveAsync(RecentStudy study)
    {
        var sure = await Dialogs.Confirm(
            $"“{study.Name}” and its versions are taken away for good.",
            "Take this study away?",
            new ConfirmOptions { OkButtonText = "Take away", CancelButtonText = "Keep", CloseDialogOnEsc = true });
        if (sure == true)
        {
            Store.Remove(study.Id);
            _recent = Store.Recent(12);
        }
    }

    private void Open(StudyDocument document)
    {
        var stored = Store.Add(string.IsNullOrWhiteSpace(document.Name) ? "Study without a name" : document.Name, StudyFileWriter.Write(document));
        Navigation.NavigateTo($"/study/{stored.Id:D}/flow");
    }

    private void Refuse(string name, IReadOnlyList<Problem> problems) => (_problemTitle, _problems) = ($"{name} was not opened", problems);
}

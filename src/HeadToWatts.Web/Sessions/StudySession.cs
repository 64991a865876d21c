using HeadToWatts.Basis.Problems;
using HeadToWatts.Basis.Units;
using HeadToWatts.Files.StudyFiles;
using HeadToWatts.Storage;
using HeadToWatts.Studies;
using HeadToWatts.Studies.Cautions;
using HeadToWatts.Studies.Inputs;
using HeadToWatts.Studies.Workings;

namespace HeadToWatts.Web.Sessions;

/// <summary>
/// The study on one visitor's screen. Every change goes document -> input -> run -> screen and into the store. What is
/// refused is told by field, and the last good result stays. All members belong to the visitor's own thread of events;
/// only the run itself, which reads nothing but its immutable input, is done elsewhere.
/// </summary>
public sealed partial class StudySession(StudyStore store, TimeProvider clock, ILogger<StudySession> log)
{
    private StudyDocument _document = new();
    private StudyInput? _waiting;
    private bool _running;
    private IReadOnlyList<Working>? _workings;

    /// <summary>Told after every change of what is shown.</summary>
    public event Action? Changed;

    /// <summary>Told when a change has come into the store, or could not.</summary>
    public event Action? Kept;

    /// <summary>Brings the changes into the store; null before a study is loaded.</summary>
    public StudyKeeper? Keeper { get; private set; }

    /// <summary>Identity of the study; empty before one is loaded.</summary>
    public Guid Id => Keeper?.Id ?? Guid.Empty;

    /// <summary>The study as entered.</summary>
    public StudyDocument Document => _document;

    /// <summary>Which alternative is worked on, from 0.</summary>
    public int AlternativeIndex { get; private set; }

    /// <summary>The alternative worked on.</summary>
    public AlternativeDocument Alternative => _document.Alternatives[AlternativeIndex];

    /// <summary>Every problem of what is entered now; empty when the result belongs to it.</summary>
    public IReadOnlyList<Problem> Problems { get; private set; } = [];

    /// <summary>The last good result; null when there was none yet.</summary>
    public StudyResult? Result { get; private set; }

    /// <summary>Cautions of the result.</summary>
    public IReadOnlyList<Caution> Cautions { get; private set; } = [];

    /// <summary>Workings of the result.</summary>
    public IReadOnlyList<Working> Workings => Result is null ? [] : _workings ??= WorkingsList.For(Result, Show);

    /// <summary>True when the result is older than what is entered.</summary>
    public bool IsStale => Result is not null && Problems.Count > 0;

    /// <summary>The family of units shown; the study holds it, the quantities in it stay as they were written.</summary>
    public UnitSystem Units => string.Equals(_document.Units?.Trim(), "SI", StringComparison.OrdinalIgnoreCase) ? UnitSystem.SI : UnitSystem.US;

    /// <summary>Units in which numbers are shown.</summary>
    public UnitDisplay Show { get; private set; } = UnitDisplay.For(UnitSystem.US);

    /// <summary>Sizes of the drawings on this visitor's screen.</summary>
    public PictureSizes Sizes { get; private set; } = PictureSizes.Usual;

    /// <summary>Fits the drawings to the visitor's window.</summary>
    /// <param name="windowWidth">Width of the window in CSS pixels.</param>
    public void FitTo(int windowWidth)
    {
        var sizes = PictureSizes.For(windowWidth);
        if (sizes == Sizes)
            return;
        Sizes = sizes;
        Changed?.Invoke();
    }

    /// <summary>Loads a study from the store.</summary>
    /// <param name="id">Its identity.</param>
    /// <returns>False when there is none, or its text cannot be read; then <see cref="Problems"/> says why.</returns>
    public bool Load(Guid id)
    {
        if (store.Find(id) is not { } stored)
            return false;
        var reading = StudyFileReader.Parse(stored.Name, stored.StudyJson);
        if (!reading.TryGet(out var document))
        {
            Problems = reading.Problems;
            return false;
        }

        Keeper = new StudyKeeper(store, clock, stored, () => Kept?.Invoke());
        if (document.Alternatives.Count == 0)
            document.Alternatives.Add(new AlternativeDocument());
        _document = document;
        AlternativeIndex = 0;
        Result = null;
        // The first result is waited for, so that the page never shows an empty answer in between.
        if (Build() is { } first)
            Take(Attempt(first.Header, first.Alternatives[0]));
        Changed?.Invoke();
        return true;
    }

    /// <summary>Changes the study and works it out anew.</summary>
    /// <param name="change">The change, made on the document.</param>
    public async Task EditAsync(Action change)
    {
        ArgumentNullException.ThrowIfNull(change);
        change();
        var working = WorkAsync();
        Keeper?.SaveSoon(string.IsNullOrWhiteSpace(_document.Name) ? "Study without a name" : _document.Name, StudyFileWriter.Write(_document));
        await working;
    }

    /// <summary>Takes what another window stored and lets go of what is on this screen.</summary>
    public void TakeTheirs() => Load(Id);

    /// <summary>Puts the study aside as a version that never changes.</summary>
    /// <param name="note">What to remember about it.</param>
    public async Task<SavedVersion?> PutAsideAsync(string note)
    {
        if (Keeper is null)
            return null;
        await Keeper.SavedAsync();
        return store.PutAside(Id, note);
    }

    /// <summary>The versions put aside, newest first.</summary>
    public IReadOnlyList<SavedVersion> Versions() => store.Versions(Id);

    /// <summary>Shows the numbers in another family of units. No quantity of the study is changed.</summary>
    /// <param name="system">The family.</param>
    public Task ShowInAsync(UnitSystem system) => EditAsync(() => _document.Units = system.ToString());

    /// <summary>Puts another document in the place of this one, from a file.</summary>
    /// <param name="document">The document.</param>
    public Task ReplaceAsync(StudyDocument document) => EditAsync(() =>
    {
        ArgumentNullException.ThrowIfNull(document);
        _document = document;
        if (document.Alternatives.Count == 0)
            document.Alternatives.Add(new AlternativeDocument());
        AlternativeIndex = 0;
    });

    /// <summary>Turns to another alternative.</summary>
    /// <param name="index">Which one, from 0.</param>
    public Task TurnToAsync(int index)
    {
        AlternativeIndex = Math.Clamp(index, 0, _document.Alternatives.Count - 1);
        Result = null;
        return WorkAsync();
    }

    /// <summary>Copies the alternative worked on and turns to the copy.</summary>
    public Task CopyAlternativeAsync()
    {
        var copy = StudyFileReader.Parse(nameof(Document), StudyFileWriter.Write(OnlyThisAlternative())).Value.Alternatives[0];
        var names = _document.Alternatives.Select(a => a.Name).ToHashSet(StringComparer.Ordinal);
        var number = 2;
        while (!names.Add($"{Alternative.Name}, variant {number}"))
            number++;
        copy.Name = $"{Alternative.Name}, variant {number}";
        return EditAsync(() =>
        {
            _document.Alternatives.Add(copy);
            AlternativeIndex = _document.Alternatives.Count - 1;
        });
    }

    /// <summary>Takes the alternative worked on away, unless it is the only one.</summary>
    public Task RemoveAlternativeAsync() => EditAsync(() =>
    {
        if (_document.Alternatives.Count < 2)
            return;
        _document.Alternatives.RemoveAt(AlternativeIndex);
        AlternativeIndex = Math.Min(AlternativeIndex, _document.Alternatives.Count - 1);
    });

    /// <summary>The problem of a field of the alternative, by its path in the study file such as "head.gross"; null when it is good.</summary>
    /// <param name="path">Path within the alternative.</param>
    public Problem? ProblemAt(string path) => Problems.FirstOrDefault(p => p.Where == Prefix + path);

    /// <summary>The problems of a part of the alternative.</summary>
    /// <param name="path">Path within the alternative.</param>
    public IEnumerable<Problem> ProblemsUnder(string path) => Problems.Where(p => p.Where == Prefix + path || p.Where.StartsWith(Prefix + path + ".", StringComparison.Ordinal) || p.Where.StartsWith(Prefix + path + "[", StringComparison.Ordinal));

    /// <summary>What stands before a field of the alternative in a problem's place. Only the alternative on the screen is built, so it is always the first.</summary>
    public const string Prefix = "alternatives[0].";

    private async Task WorkAsync()
    {
        _waiting = Build();
        if (_running)
            return;
        if (_waiting is null)
        {
            Changed?.Invoke();
            return;
        }

        _running = true;
        try
        {
            // Keystrokes that come while a run is under way wait together: only the last one is run.
            while (_waiting is { } next)
            {
                _waiting = null;
                Take(await Task.Run(() => Attempt(next.Header, next.Alternatives[0])));
                Changed?.Invoke();
            }
        }
        finally
        {
            _running = false;
        }
    }

    private StudyInput? Build()
    {
        var built = StudyBuilder.Build(OnlyThisAlternative(), NoFlowFiles.Instance);
        Problems = built.Problems;
        ChooseDisplay();
        return built.TryGet(out var input) ? input : null;
    }

    private Attempted Attempt(StudyHeader header, AlternativeInput input)
    {
        try
        {
            var result = Study.Run(header, input);
            return new Attempted(result, CautionRules.For(result, result.Show()), null);
        }
        catch (Exception e) when (e is not OutOfMemoryException)
        {
            LogRunFailed(log, e);
            return new Attempted(null, [], e.Message);
        }
    }

    private void Take(Attempted attempted)
    {
        if (attempted.Result is null)
        {
            Problems = [new Problem("study", "", "it could not be worked out: " + attempted.Trouble, "change the last entry back; the earlier result is kept")];
            return;
        }

        Result = attempted.Result;
        Cautions = attempted.Cautions;
        _workings = null;
        ChooseDisplay();
    }

    private void ChooseDisplay()
    {
        var next = Result is null ? UnitDisplay.For(Units, TypicalFlowM3PerS()) : Result.Show(Units);
        if (next.System == Show.System && ReferenceEquals(next.FlowUnit, Show.FlowUnit))
            return;
        _workings = null;
        Show = next;
    }

    // Before there is a result, the largest flow entered tells whether the flows are small.
    private double TypicalFlowM3PerS() => (Alternative.Flow.Curve ?? [])
        .Select(row => QuantityText.Read(row.Flow, Dimension.Flow, null, "").TryGet(out var held) ? held : 0)
        .DefaultIfEmpty(1).Max() is > 0 and var largest ? largest : 1;

    private StudyDocument OnlyThisAlternative() => new()
    {
        Format = _document.Format,
        Name = _document.Name,
        Place = _document.Place,
        Client = _document.Client,
        Author = _document.Author,
        Date = _document.Date,
        Revision = _document.Revision,
        Notes = _document.Notes,
        Units = _document.Units,
        Alternatives = [Alternative],
    };

    private sealed record Attempted(StudyResult? Result, IReadOnlyList<Caution> Cautions, string? Trouble);

    [LoggerMessage(Level = LogLevel.Error, Message = "A study could not be run")]
    private static partial void LogRunFailed(ILogger log, Exception exception);
}

using HeadToWatts.Storage;

namespace HeadToWatts.Web.Sessions;

/// <summary>
/// Brings the changes of one study into the store, in order and one at a time. Changes made while one is on its way are
/// stored together after it. A keeper belongs to its study for good, so that turning to another study mixes nothing up.
/// </summary>
/// <param name="store">The store.</param>
/// <param name="clock">Clock.</param>
/// <param name="stored">The study as found in the store.</param>
/// <param name="changed">Told when something to show has changed.</param>
public sealed class StudyKeeper(StudyStore store, TimeProvider clock, StoredStudy stored, Action changed)
{
    private long _edition = stored.Edition;
    private Task _saving = Task.CompletedTask;
    private (string Name, string Json)? _toSave;

    /// <summary>Identity of the study.</summary>
    public Guid Id { get; } = stored.Id;

    /// <summary>When the study was last stored.</summary>
    public DateTimeOffset SavedAt { get; private set; } = stored.ChangedAt;

    /// <summary>True while a change waits to be stored.</summary>
    public bool IsSaving => _toSave is not null;

    /// <summary>True when another window stored the study in between; nothing is stored until the visitor decides.</summary>
    public bool Conflict { get; private set; }

    /// <summary>Why the study could not be stored; null when it was.</summary>
    public string? Trouble { get; private set; }

    /// <summary>Stores the study as soon as what is on its way is through.</summary>
    /// <param name="name">Name of the study.</param>
    /// <param name="json">The study file's text.</param>
    public void SaveSoon(string name, string json)
    {
        _toSave = (name, json);
        if (_saving.IsCompleted && !Conflict)
            _saving = SaveAsync();
    }

    /// <summary>Waits until every change is stored, or a conflict stops it.</summary>
    public async Task SavedAsync()
    {
        while (!_saving.IsCompleted)
            await _saving;
    }

    /// <summary>Stores what is on this screen over what the other window stored; that stays as a version put aside.</summary>
    public Task KeepMineAsync()
    {
        store.PutAside(Id, "from another window, before it was replaced");
        if (store.Find(Id) is { } theirs)
            _edition = theirs.Edition;
        Conflict = false;
        if (_toSave is { } mine)
            SaveSoon(mine.Name, mine.Json);
        changed();
        return SavedAsync();
    }

    private async Task SaveAsync()
    {
        while (_toSave is { } next && !Conflict)
        {
            try
            {
                var edition = _edition;
                var outcome = await Task.Run(() => store.Save(Id, edition, next.Name, next.Json));
                Conflict = outcome.End == SaveEnd.ChangedElsewhere;
                Trouble = outcome.End == SaveEnd.Gone ? "the study was taken away in another window; save it as a file to keep it" : null;
                if (outcome.End == SaveEnd.Saved)
                {
                    _edition = outcome.Edition;
                    SavedAt = clock.GetUtcNow();
                }
            }
            catch (Exception e) when (e is Microsoft.Data.Sqlite.SqliteException or IOException)
            {
                Trouble = e.Message;
            }

            if (!Conflict && ReferenceEquals(_toSave?.Json, next.Json))
                _toSave = null;
            changed();
        }
    }
}

using System.Globalization;
using Dapper;
using Microsoft.Data.Sqlite;

namespace HeadToWatts.Storage;

/// <summary>
/// Studies kept in one SQLite file: the edition being worked on and the versions put aside. A study holds its own flow record.
/// Each call is one transaction that is on the disk when the call returns. Safe to use from several threads.
/// </summary>
public sealed class StudyStore : IDisposable
{
    private readonly string _connectionText;
    private readonly TimeProvider _clock;

    private StudyStore(string path, TimeProvider clock)
    {
        Path = path;
        _clock = clock;
        _connectionText = new SqliteConnectionStringBuilder { DataSource = path, ForeignKeys = true, DefaultTimeout = 10 }.ToString();
    }

    /// <summary>The database file.</summary>
    public string Path { get; }

    /// <summary>Opens the store in a folder, making both when they are not there.</summary>
    /// <param name="folder">The folder.</param>
    /// <param name="clock">Clock for the times of changes; the system's when null.</param>
    /// <exception cref="StoreTooNewException">The file was written by a later release.</exception>
    public static StudyStore Open(string folder, TimeProvider? clock = null)
    {
        ArgumentException.ThrowIfNullOrWhiteSpace(folder);
        StoreFolder.Ensure(folder);
        var store = new StudyStore(System.IO.Path.Combine(folder, "studies.db"), clock ?? TimeProvider.System);
        using var connection = store.Connect();
        Schema.BringUpToDate(connection);
        return store;
    }

    /// <summary>Adds a study.</summary>
    /// <param name="name">Name of the study.</param>
    /// <param name="studyJson">The study file's text.</param>
    public StoredStudy Add(string name, string studyJson)
    {
        ArgumentNullException.ThrowIfNull(name);
        ArgumentNullException.ThrowIfNull(studyJson);
        var study = new StoredStudy(Guid.NewGuid(), name, studyJson, 1, Now());
        using var connection = Connect();
        connection.Execute(
            "insert into study (id, name, json, edition, changed_at) values (@id, @name, @json, 1, @at)",
            new { id = Key(study.Id), name, json = studyJson, at = Text(study.ChangedAt) });
        return study;
    }

    /// <summary>Finds a study.</summary>
    /// <param name="id">Identity.</param>
    /// <returns>The study, or null when there is none.</returns>
    public StoredStudy? Find(Guid id)
    {
        using var connection = Connect();
        var row = connection.QuerySingleOrDefault<StudyRow>(
            "select name as Name, json as Json, edition as Edition, changed_at as ChangedAt from study where id = @id", new { id = Key(id) });
        return row is null ? null : new StoredStudy(id, row.Name, row.Json, row.Edition, Time(row.ChangedAt));
    }

    /// <summary>Stores a change, unless somebody else stored one in between.</summary>
    /// <param name="id">Identity.</param>
    /// <param name="edition">The edition on which the change was made.</param>
    /// <param name="name">Name of the study.</param>
    /// <param name="studyJson">The study file's text.</param>
    public SaveOutcome Save(Guid id, long edition, string name, string studyJson)
    {
        ArgumentNullException.ThrowIfNull(name);
        ArgumentNullException.ThrowIfNull(studyJson);
        using var connection = Connect();
        using var transaction = connection.BeginTransaction(deferred: false);
        var changed = connection.Execute(
            "update study set name = @name, json = @json, edition = edition + 1, changed_at = @at where id = @id and edition = @edition",
            new { id = Key(id), name, json = studyJson, edition, at = Text(Now()) },
            transaction);
        var stored = connection.QuerySingleOrDefault<long?>("select edition from study where id = @id", new { id = Key(id) }, transaction);
        transaction.Commit();
        return stored is null
            ? new SaveOutcome(SaveEnd.Gone, 0)
            : new SaveOutcome(changed == 1 ? SaveEnd.Saved : SaveEnd.ChangedElsewhere, stored.Value);
    }

    /// <summary>The studies last worked on, newest first.</summary>
    /// <param name="count">At most so many.</param>
    public IReadOnlyList<RecentStudy> Recent(int count)
    {
        using var connection = Connect();
        return
        [
            .. connection.Query<RecentRow>(
                """
                select id as Id, name as Name, changed_at as ChangedAt, (select count(*) from version v where v.study_id = s.id) as VersionCount
                from study s order by changed_at desc, id limit @count
                """,
                new { count }).Select(r => new RecentStudy(Guid.Parse(r.Id), r.Name, Time(r.ChangedAt), (int)r.VersionCount)),
        ];
    }

    /// <summary>Takes a study away with its versions.</summary>
    /// <param name="id">Identity.</param>
    /// <returns>True when it was there.</returns>
    public bool Remove(Guid id)
    {
        using var connection = Connect();
        return connection.Execute("delete from study where id = @id", new { id = Key(id) }) == 1;
    }

    /// <summary>Puts the stored edition of a study aside as a version that never changes.</summary>
    /// <param name="id">Identity.</param>
    /// <param name="note">What to remember about it.</param>
    /// <returns>The version, or null when the study is not there.</returns>
    public SavedVersion? PutAside(Guid id, string note)
    {
        ArgumentNullException.ThrowIfNull(note);
        using var connection = Connect();
        using var transaction = connection.BeginTransaction(deferred: false);
        var study = connection.QuerySingleOrDefault<StudyRow>(
            "select name as Name, json as Json, edition as Edition, changed_at as ChangedAt from study where id = @id", new { id = Key(id) }, transaction);
        if (study is null)
            return null;
        var number = 1 + (int)connection.ExecuteScalar<long>("select coalesce(max(number), 0) from version where study_id = @id", new { id = Key(id) }, transaction);
        var version = new SavedVersion(number, study.Name, note, Now());
        connection.Execute(
            "insert into version (study_id, number, name, note, json, saved_at) values (@id, @number, @name, @note, @json, @at)",
            new { id = Key(id), number, name = study.Name, note, json = study.Json, at = Text(version.SavedAt) },
            transaction);
        transaction.Commit();
        return version;
    }

    /// <summary>The versions of a study, newest first.</summary>
    /// <param name="id">Identity.</param>
    public IReadOnlyList<SavedVersion> Versions(Guid id)
    {
        using var connection = Connect();
        return
        [
            .. connection.Query<VersionRow>(
                "select number as Number, name as Name, note as Note, saved_at as SavedAt from version where study_id = @id order by number desc",
                new { id = Key(id) }).Select(r => new SavedVersion((int)r.Number, r.Name, r.Note, Time(r.SavedAt))),
        ];
    }

    /// <summary>The study file's text of a version.</summary>
    /// <param name="id">Identity.</param>
    /// <param name="number">Number of the version.</param>
    /// <returns>The text, or null when there is no such version.</returns>
    public string? VersionJson(Guid id, int number)
    {
        using var connection = Connect();
        return connection.QuerySingleOrDefault<string>("select json from version where study_id = @id and number = @number", new { id = Key(id), number });
    }

    /// <summary>Writes a whole copy of the store to a new file; copying the database file itself could miss the latest changes.</summary>
    /// <param name="path">The new file; it must not be there yet.</param>
    public void BackUp(string path)
    {
        if (File.Exists(path))
            throw new IOException($"There is already a file at {path}; a backup does not overwrite it.");
        using var connection = Connect();
        connection.Execute("vacuum into @path", new { path });
    }

    /// <inheritdoc/>
    public void Dispose()
    {
        using var connection = new SqliteConnection(_connectionText);
        SqliteConnection.ClearPool(connection);
    }

    private SqliteConnection Connect()
    {
        var connection = new SqliteConnection(_connectionText);
        connection.Open();
        return connection;
    }

    private static string Key(Guid id) => id.ToString("D");

    private DateTimeOffset Now() => _clock.GetUtcNow();

    private static string Text(DateTimeOffset time) => time.UtcDateTime.ToString("O", CultureInfo.InvariantCulture);

    private static DateTimeOffset Time(string text) => DateTimeOffset.Parse(text, CultureInfo.InvariantCulture, DateTimeStyles.RoundtripKind);

    private sealed class StudyRow
    {
        public string Name { get; init; } = "";

        public string Json { get; init; } = "";

        public long Edition { get; init; }

        public string ChangedAt { get; init; } = "";
    }

    private sealed class RecentRow
    {
        public string Id { get; init; } = "";

        public string Name { get; init; } = "";

        public string ChangedAt { get; init; } = "";

        public long VersionCount { get; init; }
    }

    private sealed class VersionRow
    {
        public long Number { get; init; }

        public string Name { get; init; } = "";

        public string Note { get; init; } = "";

        public string SavedAt { get; init; } = "";
    }
}

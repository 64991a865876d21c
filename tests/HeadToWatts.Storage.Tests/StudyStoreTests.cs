using HeadToWatts.Storage;
using Microsoft.Data.Sqlite;

namespace HeadToWatts.Storage.Tests;

public sealed class StudyStoreTests : IDisposable
{
    private readonly string _folder = Path.Combine(Path.GetTempPath(), "headtowatts-" + Guid.NewGuid().ToString("N"));

    public void Dispose()
    {
        SqliteConnection.ClearAllPools();
        Directory.Delete(_folder, recursive: true);
    }

    [Fact]
    public void A_study_is_found_again_after_the_store_was_closed_and_opened()
    {
        Guid id;
        using (var store = StudyStore.Open(_folder))
        {
            id = store.Add("Drop 7", "{\"a\":1}").Id;
            Assert.Equal(SaveEnd.Saved, store.Save(id, 1, "Drop 7, wider pipe", "{\"a\":2}").End);
        }

        using var again = StudyStore.Open(_folder);
        var found = again.Find(id);
        Assert.NotNull(found);
        Assert.Equal("Drop 7, wider pipe", found.Name);
        Assert.Equal("{\"a\":2}", found.StudyJson);
        Assert.Equal(2, found.Edition);
    }

    [Fact]
    public void A_change_made_on_an_older_edition_is_refused_and_stores_nothing()
    {
        using var store = StudyStore.Open(_folder);
        var study = store.Add("A", "{}");
        Assert.Equal(new SaveOutcome(SaveEnd.Saved, 2), store.Save(study.Id, 1, "first", "{\"n\":1}"));
        Assert.Equal(new SaveOutcome(SaveEnd.ChangedElsewhere, 2), store.Save(study.Id, 1, "second", "{\"n\":2}"));
        Assert.Equal("first", store.Find(study.Id)!.Name);
    }

    [Fact]
    public async Task Of_many_changes_made_at_once_on_one_edition_exactly_one_is_stored()
    {
        using var store = StudyStore.Open(_folder);
        var study = store.Add("A", "{}");
        var outcomes = await Task.WhenAll(Enumerable.Range(0, 16).Select(i => Task.Run(() => store.Save(study.Id, 1, "by " + i, "{}"))));
        Assert.Single(outcomes, o => o.End == SaveEnd.Saved);
        Assert.Equal(15, outcomes.Count(o => o.End == SaveEnd.ChangedElsewhere));
        Assert.Equal(2, store.Find(study.Id)!.Edition);
    }

    [Fact]
    public void Saving_or_putting_aside_a_study_that_is_gone_says_so()
    {
        using var store = StudyStore.Open(_folder);
        var study = store.Add("A", "{}");
        Assert.True(store.Remove(study.Id));
        Assert.False(store.Remove(study.Id));
        Assert.Equal(new SaveOutcome(SaveEnd.Gone, 0), store.Save(study.Id, 1, "A", "{}"));
        Assert.Null(store.PutAside(study.Id, "note"));
        Assert.Null(store.Find(study.Id));
    }

    [Fact]
    public void A_version_put_aside_stays_as_it_was_when_the_study_goes_on()
    {
        using var store = StudyStore.Open(_folder);
        var study = store.Add("A", "{\"n\":1}");
        Assert.Equal(1, store.PutAside(study.Id, "sent to the district")!.Number);
        store.Save(study.Id, 1, "A2", "{\"n\":2}");
        Assert.Equal(2, store.PutAside(study.Id, "")!.Number);

        Assert.Equal(["", "sent to the district"], store.Versions(study.Id).Select(v => v.Note));
        Assert.Equal("{\"n\":1}", store.VersionJson(study.Id, 1));
        Assert.Equal("{\"n\":2}", store.VersionJson(study.Id, 2));
        Assert.Null(store.VersionJson(study.Id, 3));
    }

    [Fact]
    public void The_study_changed_last_stands_first_in_the_list()
    {
        var clock = new SteppingClock();
        using var store = StudyStore.Open(_folder, clock);
        var a = store.Add("A", "{}");
        var b = store.Add("B", "{}");
        Assert.Equal(["B", "A"], store.Recent(10).Select(r => r.Name));
        store.Save(a.Id, 1, "A", "{}");
        store.PutAside(a.Id, "");
        Assert.Equal([a.Id, b.Id], store.Recent(10).Select(r => r.Id));
        Assert.Equal([1, 0], store.Recent(10).Select(r => r.VersionCount));
        Assert.Equal([a.Id], store.Recent(1).Select(r => r.Id));
    }

    [Fact]
    public void Removing_a_study_takes_its_versions_with_it()
    {
        using var store = StudyStore.Open(_folder);
        var study = store.Add("A", "{}");
        store.PutAside(study.Id, "");
        store.Remove(study.Id);
        Assert.Empty(store.Versions(study.Id));
    }

    [Fact]
    public void A_backup_holds_everything_and_does_not_overwrite()
    {
        using var store = StudyStore.Open(_folder);
        var study = store.Add("A", "{\"n\":1}");
        var copy = Path.Combine(_folder, "copy", "studies.db");
        Directory.CreateDirectory(Path.GetDirectoryName(copy)!);
        store.BackUp(copy);
        Assert.Throws<IOException>(() => store.BackUp(copy));

        using var restored = StudyStore.Open(Path.GetDirectoryName(copy)!);
        Assert.Equal("{\"n\":1}", restored.Find(study.Id)!.StudyJson);
    }

    [Fact]
    public void A_store_of_a_later_release_is_left_alone()
    {
        using (var store = StudyStore.Open(_folder))
        {
            using var connection = new SqliteConnection($"Data Source={store.Path}");
            connection.Open();
            using var command = connection.CreateCommand();
            command.CommandText = "pragma user_version = 99";
            command.ExecuteNonQuery();
        }

        Assert.Contains("later release", Assert.Throws<StoreTooNewException>(() => StudyStore.Open(_folder)).Message, StringComparison.Ordinal);
    }

    [Fact]
    public void Every_saved_change_is_on_the_disk_before_the_call_returns()
    {
        using var store = StudyStore.Open(_folder);
        using var connection = new SqliteConnection($"Data Source={store.Path}");
        connection.Open();
        using var command = connection.CreateCommand();
        // SQLite documentation, PRAGMA synchronous: 2 is FULL, durable under write-ahead logging.
        command.CommandText = "pragma synchronous";
        Assert.Equal(2L, command.ExecuteScalar());
        command.CommandText = "pragma journal_mode";
        Assert.Equal("wal", command.ExecuteScalar());
    }

    private sealed class SteppingClock : TimeProvider
    {
        private DateTimeOffset _now = new(2026, 5, 4, 9, 0, 0, TimeSpan.Zero);

        public override DateTimeOffset GetUtcNow() => _now = _now.AddMinutes(1);
    }
}

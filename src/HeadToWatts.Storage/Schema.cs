using Dapper;
using Microsoft.Data.Sqlite;

namespace HeadToWatts.Storage;

/// <summary>The tables, and the steps from each older shape to the present one. A step that was released never changes.</summary>
internal static class Schema
{
    private static readonly string[] Steps =
    [
        """
        create table study (
            id text primary key,
            name text not null,
            json text not null,
            edition integer not null,
            changed_at text not null
        ) strict;
        create index study_by_change on study (changed_at desc);
        create table version (
            study_id text not null references study (id) on delete cascade,
            number integer not null,
            name text not null,
            note text not null,
            json text not null,
            saved_at text not null,
            primary key (study_id, number)
        ) strict;
        """,
    ];

    /// <summary>Takes the steps that are missing, all or none.</summary>
    public static void BringUpToDate(SqliteConnection connection)
    {
        // Write-ahead logging lets a page read while a change is stored; synchronous stays FULL, so what was reported saved is saved.
        connection.Execute("pragma journal_mode = wal");
        using var transaction = connection.BeginTransaction(deferred: false);
        var taken = connection.ExecuteScalar<long>("pragma user_version", transaction: transaction);
        if (taken > Steps.Length)
            throw new StoreTooNewException(connection.DataSource, taken, Steps.Length);
        for (var step = (int)taken; step < Steps.Length; step++)
            connection.Execute(Steps[step], transaction: transaction);
        connection.Execute($"pragma user_version = {Steps.Length}", transaction: transaction);
        transaction.Commit();
    }
}

using Microsoft.EntityFrameworkCore.Migrations;

namespace BladeLog.Records.Migrations;

/// <summary>
/// The triggers of the first migration, with the tables spelt out as they stood then. A migration that rebuilds one of
/// these tables must make its triggers again: a rebuilt table loses them.
/// </summary>
internal static class FirstTriggers
{
    private static readonly string[] FactTables =
    [
        "void", "saw_setup", "setup_wheel", "setup_speed", "mount", "dismount", "slack", "meter_epoch", "meter_reading",
        "run", "cut_done", "sharpening", "joint", "split", "prior_use", "hang", "retag", "batch", "batch_line",
        "batch_return", "tension_reading", "drift", "stock_move", "hold", "hold_cleared", "inspection", "break", "retirement",
    ];

    private static readonly string[] Things = ["shop", "person", "saw", "spec", "blade", "queued_cut", "thing_history", "tag_used", "import_file"];

    private static readonly string[] EntryColumns =
    [
        "id", "op", "part", "kind", "at_utc", "entered_utc", "typed_at", "person_id", "device", "body_sha256", "answer_path",
    ];

    public static void Up(MigrationBuilder migration)
    {
        foreach (var table in FactTables)
        {
            Refuse(migration, table, "UPDATE", "a fact is written once: void it and enter it again");
            Refuse(migration, table, "DELETE", "a fact is never deleted: void it");
        }

        foreach (var table in Things)
        {
            Refuse(migration, table, "DELETE", "never deleted: put it out of use");
        }

        Refuse(migration, "entry", "DELETE", "the ledger is never shortened");
        var same = string.Join(" and ", EntryColumns.Select(c => $"NEW.{c} IS OLD.{c}"));
        migration.Sql($"""
            CREATE TRIGGER entry_no_update BEFORE UPDATE ON "entry"
            WHEN NOT ({same}
              and (OLD.previous_hash IS NULL or NEW.previous_hash IS OLD.previous_hash)
              and (OLD.hash IS NULL or NEW.hash IS OLD.hash))
            BEGIN SELECT RAISE(ABORT, 'a line of the ledger is written once'); END;
            """);

        migration.Sql("""
            CREATE TRIGGER blade_tag_first AFTER INSERT ON "blade"
            BEGIN INSERT INTO tag_used (tag, blade_id) VALUES (NEW.tag, NEW.id); END;
            """);
        migration.Sql("""
            CREATE TRIGGER blade_tag_again BEFORE UPDATE OF tag ON "blade"
            WHEN EXISTS (SELECT 1 FROM tag_used WHERE tag = NEW.tag AND blade_id <> NEW.id)
            BEGIN SELECT RAISE(ABORT, 'a tag is never used again'); END;
            """);
        migration.Sql("""
            CREATE TRIGGER blade_tag_next AFTER UPDATE OF tag ON "blade"
            BEGIN INSERT OR IGNORE INTO tag_used (tag, blade_id) VALUES (NEW.tag, NEW.id); END;
            """);
        Refuse(migration, "tag_used", "UPDATE", "a tag is never used again");
    }

    internal static void Refuse(MigrationBuilder migration, string table, string what, string why) =>
        migration.Sql($"""
            CREATE TRIGGER {table}_no_{what.ToLowerInvariant()} BEFORE {what} ON "{table}"
            BEGIN SELECT RAISE(ABORT, '{why}'); END;
            """);
}

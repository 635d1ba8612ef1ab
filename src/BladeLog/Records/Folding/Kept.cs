using System.Data.Common;
using Microsoft.EntityFrameworkCore;
using Microsoft.EntityFrameworkCore.Storage;

namespace BladeLog.Records.Folding;

/// <summary>Recounts everything kept from the facts, to write it again or to compare it.</summary>
public static class Kept
{
    /// <summary>Kept state as the facts say it should be.</summary>
    public static async Task<KeptState> Recount(ShopDb db)
    {
        var setups = (await FactReader.Setups(db)).ToLookup(s => s.SawId);
        var spells = await FactReader.ReadSpells(db);
        var bySaw = spells.ToLookup(s => s.SawId);
        var cuts = (await FactReader.Cuts(db)).ToLookup(c => c.SawId);
        var runs = await FactReader.Runs(db);
        var runsBySaw = runs.ToLookup(r => r.SawId);
        var loops = await FactReader.Loops(db);
        var shares = new List<RunShare>();
        var paths = new List<WoodPath>();
        foreach (var sawId in setups.Select(s => s.Key).Union(bySaw.Select(s => s.Key)).Union(runsBySaw.Select(r => r.Key)).Union(cuts.Select(c => c.Key)).Order())
        {
            var saw = new SawFold(sawId, bySaw[sawId], cuts[sawId], setups[sawId]);
            shares.AddRange(runsBySaw[sawId].OrderBy(r => r.From).ThenBy(r => r.Id).SelectMany(r => saw.Divide(r)));
            paths.AddRange(KeptState.PathsOf(saw, loops));
        }

        var events = (await BladeEvents.Read(db)).ToLookup(e => e.BladeId);
        var starts = await FactReader.Starts(db);
        return new KeptState(
            KeptState.OnSawsOf(spells),
            [.. starts.Select(b => BladeFold.Now(b, events[b.BladeId]))],
            shares,
            KeptState.ExposuresOf(shares, runs.ToDictionary(r => r.Id, r => r.SpeedMps)),
            paths);
    }

    /// <summary>Writes all kept state again from the facts, in one transaction of its own unless one is open.</summary>
    public static async Task Rebuild(ShopDb db)
    {
        var own = db.Database.CurrentTransaction is null ? await db.Database.BeginTransactionAsync() : null;
        await using (own)
        {
            var kept = await Recount(db);
            await db.OnSaws.ExecuteDeleteAsync();
            await db.BladesNow.ExecuteDeleteAsync();
            await db.RunShares.ExecuteDeleteAsync();
            await db.Exposures.ExecuteDeleteAsync();
            await db.WoodPaths.ExecuteDeleteAsync();
            Write(db, kept);
            if (own is not null)
            {
                await own.CommitAsync();
            }
        }
    }

    /// <summary>Prepared statements: ten times as many rows a second as through tracked rows.</summary>
    private static void Write(ShopDb db, KeptState kept)
    {
        Insert(db, "insert into on_saw (saw_id, blade_id, mount_id) values ($0, $1, $2)",
            kept.OnSaws.Select(o => new object?[] { o.SawId, o.BladeId, o.MountId }));
        Insert(db, "insert into blade_now (blade_id, place, saw_id, hook, width_m, loop_m, joint_id, hold_id) values ($0, $1, $2, $3, $4, $5, $6, $7)",
            kept.BladesNow.Select(b => new object?[] { b.BladeId, b.Place.ToString(), b.SawId, b.Hook, b.WidthM, b.LoopM, b.JointId, b.HoldId }));
        Insert(db, "insert into run_share (run_id, mount_id, setup_id, ms) values ($0, $1, $2, $3)",
            kept.Shares.Select(s => new object?[] { s.RunId, s.MountId, s.SetupId, s.Ms }));
        Insert(db, "insert into exposure (mount_id, setup_id, speed_mps, running_ms) values ($0, $1, $2, $3)",
            kept.Exposures.Select(e => new object?[] { e.MountId, e.SetupId, e.SpeedMps, e.RunningMs }));
        Insert(db, "insert into wood_path (mount_id, wood_class, dirt, path_mm, area_mm2, cut_ms) values ($0, $1, $2, $3, $4, $5)",
            kept.Paths.Select(p => new object?[] { p.MountId, p.WoodClass, p.Dirt.ToString(), p.PathMm, p.AreaMm2, p.CutMs }));
    }

    private static void Insert(ShopDb db, string sql, IEnumerable<object?[]> rows)
    {
        using var command = db.Database.GetDbConnection().CreateCommand();
#pragma warning disable CA2100 // The statements are the constants above.
        command.CommandText = sql;
#pragma warning restore CA2100
        command.Transaction = db.Database.CurrentTransaction!.GetDbTransaction();
        foreach (var row in rows)
        {
            for (var i = 0; i < row.Length; i++)
            {
                if (command.Parameters.Count <= i)
                {
                    DbParameter parameter = command.CreateParameter();
                    parameter.ParameterName = $"${i}";
                    command.Parameters.Add(parameter);
                }

                command.Parameters[i].Value = row[i] ?? DBNull.Value;
            }

            command.ExecuteNonQuery();
        }
    }
}

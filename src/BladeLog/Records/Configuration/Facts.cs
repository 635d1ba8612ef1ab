using System.Linq.Expressions;
using Microsoft.EntityFrameworkCore;
using Microsoft.EntityFrameworkCore.Metadata.Builders;

namespace BladeLog.Records.Configuration;

/// <summary>The ledger and its facts: one key with the entry, a filter that hides what was struck out, and the references between facts.</summary>
public static class Facts
{
    /// <summary>Name of the filter, to lift it where struck-out facts are to be shown.</summary>
    public const string NotVoided = "NotVoided";

    public static void Apply(ModelBuilder model)
    {
        Ledger(model);

        var setup = Fact<SawSetup>(model);
        Refers(setup, s => s.Saw, s => s.SawId);
        setup.Ignore(s => s.UsualSpeedMps);
        setup.HasMany(s => s.Wheels).WithOne().HasForeignKey(w => w.SetupId).OnDelete(DeleteBehavior.Restrict);
        setup.HasMany(s => s.Speeds).WithOne().HasForeignKey(s => s.SetupId).OnDelete(DeleteBehavior.Restrict);
        setup.ToTable(t =>
        {
            t.HasCheckConstraint("ck_saw_setup_loop", "loop_least_m <= loop_m and loop_m <= loop_most_m");
            t.HasCheckConstraint("ck_saw_setup_width", "width_least_m <= width_most_m");
            t.HasCheckConstraint("ck_saw_setup_meter_factor_range", "meter_factor <= 1");
            t.HasCheckConstraint("ck_saw_setup_tilt", "tilt_most_rad < 1.5707");
        });
        model.Entity<SetupWheel>();
        model.Entity<SetupSpeed>();

        var mount = Fact<Mount>(model);
        Refers(mount, m => m.Saw, m => m.SawId);
        Refers(mount, m => m.Blade, m => m.BladeId);
        Refers(Fact<Dismount>(model), d => d.Mount, d => d.MountId);
        Refers(Fact<Slack>(model), s => s.Saw, s => s.SawId);
        var check = Fact<StartCheck>(model);
        Refers(check, c => c.Saw, c => c.SawId);
        check.Ignore(c => c.SawNotRight);

        Refers<MeterEpoch, Saw>(Fact<MeterEpoch>(model), null, e => e.SawId);
        var reading = Fact<MeterReading>(model);
        Refers<MeterReading, Saw>(reading, null, r => r.SawId);
        Refers<MeterReading, MeterEpoch>(reading, null, r => r.EpochId);

        var run = Fact<Run>(model);
        Refers(run, r => r.Saw, r => r.SawId);
        Refers<Run, MeterReading>(run, null, r => r.ReadingId);
        Refers<Run, TimerStarted>(run, null, r => r.TimerId);
        Refers(Fact<TimerStarted>(model), t => t.Saw, t => t.SawId);

        // By its end first: what is entered is mostly recent, so few runs end after a window begins.
        run.HasIndex(r => new { r.SawId, r.UntilUtc, r.FromUtc });
        run.ToTable(t => t.HasCheckConstraint("ck_run_window", "from_utc < until_utc"));

        var cut = Fact<CutDone>(model);
        Refers(cut, c => c.Saw, c => c.SawId);
        Refers<CutDone, QueuedCut>(cut, null, c => c.QueuedCutId);

        var sharpening = Fact<Sharpening>(model);
        Refers(sharpening, s => s.Blade, s => s.BladeId);
        Refers<Sharpening, Batch>(sharpening, null, s => s.BatchId);
        sharpening.ToTable(t => t.HasCheckConstraint("ck_sharpening_gullet", "gullet_m is null or width_m is null or gullet_m < width_m"));
        Refers(Fact<Joint>(model), j => j.Blade, j => j.BladeId);
        var split = Fact<Split>(model);
        Refers<Split, Blade>(split, null, s => s.ParentId);
        Refers<Split, Blade>(split, null, s => s.ChildId);
        var prior = Fact<PriorUse>(model);
        Refers<PriorUse, Blade>(prior, null, p => p.BladeId);
        prior.ToTable(t => t.HasCheckConstraint("ck_prior_use_range", "used_low <= used_high"));
        Refers<Hang, Blade>(Fact<Hang>(model), null, h => h.BladeId);
        Refers<Retag, Blade>(Fact<Retag>(model), null, r => r.BladeId);

        var batch = Fact<Batch>(model);
        batch.HasIndex(b => b.Number);
        var line = Fact<BatchLine>(model);
        line.HasOne(l => l.Batch).WithMany(b => b.Lines).HasForeignKey(l => l.BatchId).OnDelete(DeleteBehavior.Restrict);
        Refers(line, l => l.Blade, l => l.BladeId);
        Refers(Fact<BatchReturn>(model), r => r.Line, r => r.LineId);

        var tension = Fact<TensionReading>(model);
        Refers<TensionReading, Saw>(tension, null, t => t.SawId);
        Refers<TensionReading, Blade>(tension, null, t => t.BladeId);
        var drift = Fact<Drift>(model);
        Refers<Drift, Saw>(drift, null, d => d.SawId);
        Refers<Drift, Blade>(drift, null, d => d.BladeId);
        var kerf = Fact<KerfReading>(model);
        Refers(kerf, k => k.Blade, k => k.BladeId);
        Refers(kerf, k => k.Saw, k => k.SawId);
        kerf.ToTable(t =>
        {
            t.HasCheckConstraint("ck_kerf_reading_says_something", "kerf_m is not null or set_both_m is not null");
            t.HasCheckConstraint("ck_kerf_reading_both_sides", "(set_left_m is null) = (set_right_m is null) and (set_left_m is null or set_both_m is not null)");
        });
        Refers<StockMove, Spec>(Fact<StockMove>(model), null, s => s.SpecId);

        Refers(Fact<Hold>(model), h => h.Blade, h => h.BladeId);
        Refers(Fact<HoldCleared>(model), c => c.Hold, c => c.HoldId);
        Refers(Fact<Inspection>(model), i => i.Blade, i => i.BladeId);
        var broke = Fact<Break>(model);
        Refers(broke, b => b.Blade, b => b.BladeId);
        Refers<Break, Saw>(broke, null, b => b.SawId);
        broke.ToTable(t =>
        {
            t.HasCheckConstraint("ck_break_window", "earliest_utc <= latest_utc");
            t.HasCheckConstraint("ck_break_hours", "hours_low is null or hours_high is null or hours_low <= hours_high");
        });
        Refers(Fact<Retirement>(model), r => r.Blade, r => r.BladeId);

        Fact<HandOver>(model).ToTable(t => t.HasCheckConstraint("ck_hand_over_text", "length(text) between 1 and 4000"));
        Refers(Fact<HandOverRead>(model), r => r.HandOver, r => r.HandOverId);
        var trained = Fact<Trained>(model);
        Refers(trained, t => t.Person, t => t.PersonId);
        Refers(trained, t => t.Saw, t => t.SawId);
        Refers(trained, t => t.By, t => t.ById);
        Refers(Fact<LabelPrinted>(model), l => l.Blade, l => l.BladeId);
    }

    private static void Ledger(ModelBuilder model)
    {
        var entry = model.Entity<Entry>();
        entry.HasIndex(e => new { e.Op, e.Part }).IsUnique();
        entry.HasIndex(e => e.AtUtc);
        entry.HasOne(e => e.Person).WithMany().HasForeignKey(e => e.PersonId).OnDelete(DeleteBehavior.Restrict);

        var strike = model.Entity<VoidFact>();
        strike.HasKey(v => v.EntryId);
        strike.HasOne(v => v.Entry).WithOne().HasForeignKey<VoidFact>(v => v.EntryId).OnDelete(DeleteBehavior.Restrict);
        strike.HasOne(v => v.Voided).WithOne(e => e.Void).HasForeignKey<VoidFact>(v => v.VoidedId).OnDelete(DeleteBehavior.Restrict);
        strike.ToTable(t => t.HasCheckConstraint("ck_void_not_itself", "voided_id < entry_id"));
    }

    private static EntityTypeBuilder<T> Fact<T>(ModelBuilder model)
        where T : Fact
    {
        var fact = model.Entity<T>();
        fact.HasKey(f => f.EntryId);
        fact.Property(f => f.EntryId).ValueGeneratedNever();
        fact.HasOne(f => f.Entry).WithOne().HasForeignKey<T>(f => f.EntryId).OnDelete(DeleteBehavior.Restrict);
        fact.HasQueryFilter(NotVoided, f => f.Entry.Void == null);
        return fact;
    }

    private static void Refers<T, TTo>(EntityTypeBuilder<T> fact, Expression<Func<T, TTo?>>? by, Expression<Func<T, object?>> key)
        where T : Fact
        where TTo : class =>
        fact.HasOne(by).WithMany().HasForeignKey(key).OnDelete(DeleteBehavior.Restrict);
}

using BladeLog.Records.Configuration;
using Microsoft.EntityFrameworkCore;
using Microsoft.EntityFrameworkCore.Storage.ValueConversion;

namespace BladeLog.Records;

/// <summary>The shop's file. Things are edited with a history; entries and facts are only ever added.</summary>
public sealed class ShopDb(DbContextOptions<ShopDb> options) : DbContext(options)
{
    public DbSet<Shop> Shops => Set<Shop>();

    public DbSet<Setting> Settings => Set<Setting>();

    public DbSet<Person> People => Set<Person>();

    public DbSet<PersonRole> PersonRoles => Set<PersonRole>();

    public DbSet<Saw> Saws => Set<Saw>();

    public DbSet<Spec> Specs => Set<Spec>();

    public DbSet<Blade> Blades => Set<Blade>();

    public DbSet<TagUsed> TagsUsed => Set<TagUsed>();

    public DbSet<QueuedCut> QueuedCuts => Set<QueuedCut>();

    public DbSet<ThingHistory> ThingHistories => Set<ThingHistory>();

    public DbSet<ImportFile> ImportFiles => Set<ImportFile>();

    public DbSet<Entry> Entries => Set<Entry>();

    public DbSet<VoidFact> Voids => Set<VoidFact>();

    public DbSet<SawSetup> SawSetups => Set<SawSetup>();

    public DbSet<Mount> Mounts => Set<Mount>();

    public DbSet<Dismount> Dismounts => Set<Dismount>();

    public DbSet<Slack> Slacks => Set<Slack>();

    public DbSet<StartCheck> StartChecks => Set<StartCheck>();

    public DbSet<TimerStarted> TimersStarted => Set<TimerStarted>();

    public DbSet<MeterEpoch> MeterEpochs => Set<MeterEpoch>();

    public DbSet<MeterReading> MeterReadings => Set<MeterReading>();

    public DbSet<Run> Runs => Set<Run>();

    public DbSet<CutDone> CutsDone => Set<CutDone>();

    public DbSet<Sharpening> Sharpenings => Set<Sharpening>();

    public DbSet<Joint> Joints => Set<Joint>();

    public DbSet<Split> Splits => Set<Split>();

    public DbSet<PriorUse> PriorUses => Set<PriorUse>();

    public DbSet<Hang> Hangs => Set<Hang>();

    public DbSet<Retag> Retags => Set<Retag>();

    public DbSet<Batch> Batches => Set<Batch>();

    public DbSet<BatchLine> BatchLines => Set<BatchLine>();

    public DbSet<BatchReturn> BatchReturns => Set<BatchReturn>();

    public DbSet<TensionReading> TensionReadings => Set<TensionReading>();

    public DbSet<Drift> Drifts => Set<Drift>();

    public DbSet<KerfReading> KerfReadings => Set<KerfReading>();

    public DbSet<StockMove> StockMoves => Set<StockMove>();

    public DbSet<Hold> Holds => Set<Hold>();

    public DbSet<HoldCleared> HoldsCleared => Set<HoldCleared>();

    public DbSet<Inspection> Inspections => Set<Inspection>();

    public DbSet<Break> Breaks => Set<Break>();

    public DbSet<Retirement> Retirements => Set<Retirement>();

    public DbSet<HandOver> HandOvers => Set<HandOver>();

    public DbSet<HandOverRead> HandOversRead => Set<HandOverRead>();

    public DbSet<Trained> Trainings => Set<Trained>();

    public DbSet<LabelPrinted> LabelsPrinted => Set<LabelPrinted>();

    public DbSet<OnSaw> OnSaws => Set<OnSaw>();

    public DbSet<BladeNow> BladesNow => Set<BladeNow>();

    public DbSet<RunShare> RunShares => Set<RunShare>();

    public DbSet<Exposure> Exposures => Set<Exposure>();

    public DbSet<WoodPath> WoodPaths => Set<WoodPath>();

    /// <summary>When and by whom the things of this context are edited; without it no edit is saved.</summary>
    internal (DateTime At, int? PersonId)? Editing { get; set; }

    public override int SaveChanges(bool acceptAllChangesOnSuccess)
    {
        RecordRules.Guard(this);
        return base.SaveChanges(acceptAllChangesOnSuccess);
    }

    public override Task<int> SaveChangesAsync(bool acceptAllChangesOnSuccess, CancellationToken cancellationToken = default)
    {
        RecordRules.Guard(this);
        return base.SaveChangesAsync(acceptAllChangesOnSuccess, cancellationToken);
    }

    protected override void ConfigureConventions(ModelConfigurationBuilder configurationBuilder)
    {
        configurationBuilder.Properties<Enum>().HaveConversion<string>();
        configurationBuilder.Properties<DateTime>().HaveConversion<UtcMilliseconds>();
    }

    protected override void OnModelCreating(ModelBuilder modelBuilder)
    {
        Configuration.Things.Apply(modelBuilder);
        Facts.Apply(modelBuilder);
        Kept.Apply(modelBuilder);
        Naming.Apply(modelBuilder.Model);
        Checks.Apply(modelBuilder.Model);
    }

    /// <summary>Times are UTC to the millisecond; SQLite gives them back without their kind.</summary>
    private sealed class UtcMilliseconds() : ValueConverter<DateTime, DateTime>(t => RecordRules.Store(t), t => DateTime.SpecifyKind(t, DateTimeKind.Utc));
}

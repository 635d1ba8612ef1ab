using Microsoft.EntityFrameworkCore;

namespace BladeLog.Records.Configuration;

/// <summary>Kept state: its keys hold what must never be true of two rows at once.</summary>
public static class Kept
{
    public static void Apply(ModelBuilder model)
    {
        var onSaw = model.Entity<OnSaw>();
        onSaw.HasKey(o => o.SawId);
        onSaw.Property(o => o.SawId).ValueGeneratedNever();
        onSaw.HasIndex(o => o.BladeId).IsUnique();
        onSaw.HasOne<Saw>().WithOne().HasForeignKey<OnSaw>(o => o.SawId).OnDelete(DeleteBehavior.Restrict);
        onSaw.HasOne<Blade>().WithMany().HasForeignKey(o => o.BladeId).OnDelete(DeleteBehavior.Restrict);
        onSaw.HasOne<Mount>().WithMany().HasForeignKey(o => o.MountId).OnDelete(DeleteBehavior.Restrict);

        var now = model.Entity<BladeNow>();
        now.HasKey(b => b.BladeId);
        now.Property(b => b.BladeId).ValueGeneratedNever();
        now.HasOne<Blade>().WithOne().HasForeignKey<BladeNow>(b => b.BladeId).OnDelete(DeleteBehavior.Restrict);
        now.HasOne<Saw>().WithMany().HasForeignKey(b => b.SawId).OnDelete(DeleteBehavior.Restrict);
        now.HasOne<Joint>().WithMany().HasForeignKey(b => b.JointId).OnDelete(DeleteBehavior.Restrict);
        now.HasOne<Hold>().WithMany().HasForeignKey(b => b.HoldId).OnDelete(DeleteBehavior.Restrict);

        var share = model.Entity<RunShare>();
        share.HasOne<Run>().WithMany().HasForeignKey(s => s.RunId).OnDelete(DeleteBehavior.Restrict);
        share.HasOne<Mount>().WithMany().HasForeignKey(s => s.MountId).OnDelete(DeleteBehavior.Restrict);
        share.HasOne<SawSetup>().WithMany().HasForeignKey(s => s.SetupId).OnDelete(DeleteBehavior.Restrict);

        var exposure = model.Entity<Exposure>();
        exposure.HasOne<Mount>().WithMany().HasForeignKey(e => e.MountId).OnDelete(DeleteBehavior.Restrict);
        exposure.HasOne<SawSetup>().WithMany().HasForeignKey(e => e.SetupId).OnDelete(DeleteBehavior.Restrict);
        exposure.HasIndex(e => new { e.MountId, e.SetupId, e.SpeedMps, e.RunningMs }).HasDatabaseName("ix_exposure_covering");

        var path = model.Entity<WoodPath>();
        path.HasOne<Mount>().WithMany().HasForeignKey(p => p.MountId).OnDelete(DeleteBehavior.Restrict);
        path.HasIndex(p => new { p.MountId, p.WoodClass, p.Dirt }).IsUnique();
    }
}

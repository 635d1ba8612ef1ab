using Microsoft.EntityFrameworkCore;
using Microsoft.EntityFrameworkCore.Metadata.Builders;

namespace BladeLog.Records.Configuration;

/// <summary>What is edited: unique codes, versions, and the checks that span two columns.</summary>
public static class Things
{
    public static void Apply(ModelBuilder model)
    {
        Thing(model.Entity<Shop>());
        model.Entity<Setting>().HasKey(s => s.Key);

        var person = model.Entity<Person>();
        Thing(person);
        person.Property(p => p.Initials).UseCollation("NOCASE");
        person.HasIndex(p => p.Initials).IsUnique();
        person.HasMany(p => p.Roles).WithOne().HasForeignKey(r => r.PersonId).OnDelete(DeleteBehavior.Restrict);

        var saw = model.Entity<Saw>();
        Thing(saw);
        saw.Property(s => s.Code).UseCollation("NOCASE");
        saw.HasIndex(s => s.Code).IsUnique();

        var spec = model.Entity<Spec>();
        Thing(spec);
        spec.Property(s => s.Code).UseCollation("NOCASE");
        spec.HasIndex(s => s.Code).IsUnique();
        spec.Ignore(s => s.PitchMeanM);
        spec.ToTable(t =>
        {
            t.HasCheckConstraint("ck_spec_gullet_in_width", "gullet_depth_m is null or gullet_depth_m < width_m");
            t.HasCheckConstraint("ck_spec_least_width", "least_width_m is null or least_width_m <= width_m");
            t.HasCheckConstraint("ck_spec_pitch_order", "pitch_fine_m <= pitch_coarse_m");
            t.HasCheckConstraint("ck_spec_kerf_over_body", "kerf_m is null or kerf_m > thickness_m");
            t.HasCheckConstraint("ck_spec_body_in_width", "thickness_m < width_m");
        });

        var blade = model.Entity<Blade>();
        Thing(blade);
        blade.Property(b => b.Tag).UseCollation("NOCASE");
        blade.HasIndex(b => b.Tag).IsUnique();
        blade.HasOne(b => b.Spec).WithMany().HasForeignKey(b => b.SpecId).OnDelete(DeleteBehavior.Restrict);
        blade.HasOne(b => b.Parent).WithMany().HasForeignKey(b => b.ParentId).OnDelete(DeleteBehavior.Restrict);
        blade.ToTable(t => t.HasCheckConstraint(
            "ck_blade_tag", "length(tag) between 1 and 12 and tag not glob '*[^A-Za-z0-9.-]*'"));

        var tag = model.Entity<TagUsed>();
        tag.HasKey(t => t.Tag);
        tag.Property(t => t.Tag).UseCollation("NOCASE");
        tag.HasOne<Blade>().WithMany().HasForeignKey(t => t.BladeId).OnDelete(DeleteBehavior.Restrict);

        var cut = model.Entity<QueuedCut>();
        Thing(cut);
        cut.HasIndex(c => c.Number).IsUnique();
        cut.HasOne<Entry>().WithMany().HasForeignKey(c => c.DoneEntryId).OnDelete(DeleteBehavior.Restrict);
        cut.ToTable(t =>
        {
            t.HasCheckConstraint("ck_queued_cut_nail", "nail_chance <= 1");
            t.HasCheckConstraint("ck_queued_cut_bevel", "bevel_rad < 1.5707");
        });

        var import = model.Entity<ImportFile>();
        import.HasIndex(i => i.Sha256).IsUnique();
        import.HasOne(i => i.Entry).WithMany().HasForeignKey(i => i.EntryId).OnDelete(DeleteBehavior.Restrict);

        var history = model.Entity<ThingHistory>();
        history.HasIndex(h => new { h.Thing, h.ThingId });
        history.HasOne<Person>().WithMany().HasForeignKey(h => h.PersonId).OnDelete(DeleteBehavior.Restrict);
    }

    private static void Thing<T>(EntityTypeBuilder<T> thing)
        where T : Thing
    {
        thing.HasIndex(t => t.Uid).IsUnique();
        thing.Property(t => t.Version).IsConcurrencyToken();
    }
}

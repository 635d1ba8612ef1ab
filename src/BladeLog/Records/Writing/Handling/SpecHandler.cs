using Microsoft.EntityFrameworkCore;

namespace BladeLog.Records.Writing;

internal static class SpecHandler
{
    public static async Task Handle(WriteSession w, AddSpec c)
    {
        c.Spec.Code = c.Spec.Code.Trim();
        Check(w, c.Spec);
        w.RefuseUnless(!await w.Db.Specs.AnyAsync(s => s.Code == c.Spec.Code), "Code", $"There is a specification {c.Spec.Code} already.");
        if (!w.Stands)
        {
            return;
        }

        w.NewEntry(nameof(AddSpec), w.Now);
        w.Db.Specs.Add(c.Spec);
        w.AnswerPath = "/stock";
    }

    public static async Task Handle(WriteSession w, EditSpec c)
    {
        var code = c.Code.Trim();
        var spec = await w.Db.Specs.SingleOrDefaultAsync(s => s.Code == code);
        if (spec is null)
        {
            w.Refuse("Code", $"There is no specification {code}.");
            return;
        }

        c.Spec.Code = c.Spec.Code.Trim();
        Check(w, c.Spec);
        w.RefuseUnless(!await w.Db.Specs.AnyAsync(s => s.Code == c.Spec.Code && s.Id != spec.Id), "Code", $"There is a specification {c.Spec.Code} already.");
        if (!w.Stands || !await Edits.Edit(w, spec, c.Version, c.Spec, $"specification {code}"))
        {
            return;
        }

        w.NewEntry(nameof(EditSpec), w.Now);
        w.AnswerPath = "/stock";
        foreach (var blade in await w.Db.Blades.Where(b => b.SpecId == spec.Id).Select(b => b.Id).ToListAsync())
        {
            w.Touched.Loop(blade);
        }
    }

    private static void Check(WriteSession w, Spec s)
    {
        w.RefuseUnless(s.Code.Length > 0, "Code", "Give the specification a code.");
        w.RefuseUnless(s.GulletDepthM is null || s.GulletDepthM < s.WidthM, "GulletDepthM", "The gullet must be less deep than the blade is wide.");
        w.RefuseUnless(s.GulletAreaM2 is null || s.GulletDepthM is null || s.GulletAreaM2 < s.PitchCoarseM * s.GulletDepthM, "GulletAreaM2", "A gullet has less area than pitch times its depth. Check all three.");
        w.RefuseUnless(s.BodyHrc is null or (>= 20 and <= 58), "BodyHrc", "The body of a band has 20 to 58 HRC.");
        w.RefuseUnless(s.ThicknessM < s.WidthM, "ThicknessM", "The blade must be wider than it is thick.");
        w.RefuseUnless(s.KerfM is null || s.KerfM > s.ThicknessM, "KerfM", "The kerf must be wider than the body is thick.");
        w.RefuseUnless(s.LeastWidthM is null || s.LeastWidthM <= s.WidthM, "LeastWidthM", "The least width must not be more than the width when new.");
        w.RefuseUnless(s.PitchFineM <= s.PitchCoarseM, "PitchFineM", "The fine pitch must not be coarser than the coarse one.");
    }
}

using BladeLog.Handbook.Quantities;

namespace BladeLog.Records.Sample;

/// <summary>The blades' own facts: bench, batches, welds, what was seen, and what was struck out.</summary>
internal sealed partial class SampleFacts
{
    private readonly Dictionary<Mount, Dismount> _dismounts = [];
    private readonly Dictionary<string, Batch> _batches = [];
    private readonly Dictionary<(string Batch, string Tag), BatchLine> _lines = [];

    private void BladeFacts()
    {
        Each("batches", SendBatch);
        Each("batch_lines", SendBlade);
        Each("returns", Return);
        Each("sharpenings", Sharpen);
        Each("kerf_readings", Kerf);
        Each("prior_use", PriorUse);
        Each("splits", Split);
        Each("joints", Join);
        Each("inspections", Inspect);
        Each("holds", Hold);
        Each("holds_cleared", ClearHold);
        Each("breaks", Break);
        Each("retirements", Retire);
        Each("retags", Retag);
        Each("hangs", Hang);
    }

    private void SendBatch(SampleRow row) => _batches[row.Text("batch")] = Add(row, new Batch
    {
        Number = row.Text("batch"),
        Service = row.Text("service"),
        PromisedUtc = row.Optional("promised_day") is null ? null : Clock.StartOf(row, "promised_day"),
    });

    private void SendBlade(SampleRow row)
    {
        var batch = row.Of("batch", _batches, "batch");
        var line = new BatchLine { BladeId = Blade(row) };
        ledger.Name(row, ledger.Add(line, batch.Entry.AtUtc, null, batch.Entry.PersonId, l => l.BatchId = batch.EntryId));
        _lines[(batch.Number, row.Text("tag"))] = line;
    }

    private void Return(SampleRow row)
    {
        if (!_lines.TryGetValue((row.Text("batch"), row.Text("tag")), out var line))
        {
            throw row.Wrong("tag", $"{row.Text("tag")} was not in batch {row.Text("batch")}");
        }

        Add(row, new BatchReturn { Outcome = row.Case<ReturnOutcome>("outcome"), WidthM = row.OptionalMetres("width_mm") }, null, r => r.LineId = line.EntryId);
    }

    private void Sharpen(SampleRow row)
    {
        var batch = row.Optional("batch") is null ? null : row.Of("batch", _batches, "batch");
        Add(row, new Sharpening
        {
            BladeId = Blade(row),
            Kind = row.Case<GrindKind>("kind"),
            SetAgain = row.Yes("set_again"),
            WidthM = row.OptionalMetres("width_mm"),
            WidthTyped = row.Optional("width_mm") is { } width ? $"{width} mm" : null,
            GulletM = row.OptionalMetres("gullet_mm"),
            KerfM = row.OptionalMetres("kerf_mm"),
            EdgeAfterM = row.OptionalNumber("edge_um") / 1e6,
            PriceMinor = row.OptionalMoney("price_minor"),
        }, null, s => s.BatchId = batch?.EntryId);
    }

    private void Kerf(SampleRow row)
    {
        var (left, right) = (row.OptionalMetres("set_left_mm"), row.OptionalMetres("set_right_mm"));
        Add(row, new KerfReading
        {
            BladeId = Blade(row),
            How = row.Case<KerfHow>("how"),
            KerfM = row.OptionalMetres("kerf_mm"),
            KerfTyped = row.Optional("kerf_mm") is { } kerf ? $"{kerf} mm" : null,
            SetLeftM = left,
            SetRightM = right,
            SetBothM = left + right,
            SetTyped = left is null ? null : $"{row.Text("set_left_mm")} mm; {row.Text("set_right_mm")} mm",
            Note = row.Optional("note"),
        });
    }

    private void PriorUse(SampleRow row) => Add(row, new PriorUse
    {
        BladeId = Blade(row),
        UsedLow = row.Number("low_used"),
        UsedHigh = row.Number("high_used"),
        WidthM = row.OptionalMetres("width_mm"),
        Sharpenings = row.OptionalWhole("sharpenings_before"),
        Source = row.Optional("source"),
    });

    private void Split(SampleRow row) => Add(row, new Split
    {
        ParentId = Blade(row, "parent"),
        ChildId = Blade(row, "child"),
        WidthM = row.OptionalMetres("width_mm"),
    });

    private void Join(SampleRow row) => Add(row, new Joint
    {
        BladeId = Blade(row),
        LoopM = row.Metres("loop_mm"),
        LoopTyped = $"{row.Text("loop_mm")} mm",
        Quality = row.Case<WeldQuality>("quality"),
        Method = string.Join(", ", new[] { row.Text("method"), row.Yes("annealed") ? "annealed" : "not annealed", row.Yes("dressed") ? "dressed flush" : "not dressed" }),
    });

    private void Inspect(SampleRow row) => Add(row, new Inspection
    {
        BladeId = Blade(row),
        Found = row.Case<Found>("finding"),
        CrackLengthM = row.OptionalMetres("crack_mm"),
        Place = row.OptionalCase<CrackPlace>("place"),
    });

    private void Hold(SampleRow row) => Add(row, new Hold
    {
        BladeId = Blade(row),
        Kind = row.Case<HoldKind>("kind"),
        CrackLengthM = row.OptionalMetres("crack_mm"),
        CrackTyped = row.Optional("crack_mm") is { } crack ? $"{crack} mm" : null,
        Place = row.OptionalCase<CrackPlace>("place"),
        Note = row.Optional("note"),
    });

    private void ClearHold(SampleRow row)
    {
        var hold = ledger.Named<Hold>(row, "hold");
        Add(row, new HoldCleared { How = row.Text("how") }, null, c => c.HoldId = hold.EntryId);
    }

    private void Break(SampleRow row) => Add(row, new Break
    {
        BladeId = Blade(row),
        SawId = Saw(row),
        Site = row.Case<BreakSite>("site"),
        EarliestUtc = Clock.At(row, "earliest_"),
        LatestUtc = Clock.At(row, "latest_"),
        HoursLow = row.OptionalNumber("hours_low"),
        HoursHigh = row.OptionalNumber("hours_high"),
        MinutesLost = row.OptionalNumber("minutes_lost"),
        Note = row.Optional("note"),
    }, Learned(row));

    private void Retire(SampleRow row) => Add(row, new Retirement
    {
        BladeId = Blade(row),
        Reason = row.Case<RetireReason>("reason"),
        CutUp = row.Yes("cut_up"),
        Note = row.Optional("note"),
    });

    private void Retag(SampleRow row) => Add(row, new Retag { BladeId = Blade(row), OldTag = row.Text("tag_on_label"), NewTag = row.Text("tag") });

    private void Hang(SampleRow row) => Add(row, new Hang { BladeId = Blade(row), Place = row.Case<Place>("place"), Hook = row.Optional("hook") });

    /// <summary>A mount is struck out with its dismount.</summary>
    private void Void(SampleRow row)
    {
        var fact = ledger.Named<Fact>(row, "voids");
        Add(row, new VoidFact { Reason = row.Text("reason") }, null, v => v.VoidedId = fact.EntryId);
        if (fact is Mount mount && _dismounts.TryGetValue(mount, out var dismount))
        {
            ledger.Add(new VoidFact { Reason = row.Text("reason") }, Clock.At(row), null, Who(row), v => v.VoidedId = dismount.EntryId);
        }
    }
}

using System.Globalization;
using BladeLog.Handbook.Units;
using Microsoft.EntityFrameworkCore;

namespace BladeLog.Records.Writing;

/// <summary>One write under way: makes entries, gathers what stands against it, and remembers whose sums it touched.</summary>
internal sealed class WriteSession(ShopDb db, Sent sent, byte[] body)
{
    /// <summary>How far a tablet's clock may run ahead.</summary>
    private static readonly TimeSpan ClockSlack = TimeSpan.FromMinutes(5);

    private readonly List<Problem> _refusals = [];
    private readonly List<Problem> _asks = [];
    private readonly List<Entry> _entries = [];
    private readonly List<Fact> _facts = [];
    private Shop? _shop;
    private int _part;
    private int _before;
    private string _fieldPrefix = "";

    public ShopDb Db { get; } = db;

    public Sent Sent { get; } = sent;

    public DateTime Now { get; } = RecordRules.Store(sent.Now);

    public Touched Touched { get; } = new();

    public string AnswerPath { get; set; } = "/";

    public string OneMoreTap { get; private set; } = "Record it";

    /// <summary>Something was entered again for another blade.</summary>
    public bool Moved { get; set; }

    public WriteResult.Clash? ClashWith { get; set; }

    public IReadOnlyList<Problem> Refusals => _refusals;

    public IReadOnlyList<Problem> Asks => _asks;

    /// <summary>Nothing stands against this write so far; of a file, against its present row.</summary>
    public bool Stands => _refusals.Count == _before && ClashWith is null;

    public Entry? First { get; private set; }

    /// <summary>The next row of a file: its problems name its line.</summary>
    public void BeginRow(int line)
    {
        _fieldPrefix = $"line {line}: ";
        _before = _refusals.Count;
    }

    /// <summary>What a row asks, a file cannot be asked: it becomes a refusal.</summary>
    public void RefuseAsked()
    {
        _refusals.AddRange(_asks);
        _asks.Clear();
    }

    /// <summary>Saves what there is so far, where the rest needs its keys.</summary>
    public async Task Save()
    {
        if (First is { } first && Db.Entry(first).State == EntityState.Added)
        {
            first.AnswerPath = Sent.AnswerPath ?? AnswerPath;
        }

        await Db.SaveChangesAsync();
    }

    /// <summary>Chains what was saved to the line before it.</summary>
    public Task Seal() => Chain.Seal(Db, _entries, _facts);

    public void Refuse(string field, string sentence) => _refusals.Add(new Problem(_fieldPrefix + field, sentence));

    public void RefuseUnless(bool holds, string field, string sentence)
    {
        if (!holds)
        {
            Refuse(field, sentence);
        }
    }

    public void Ask(string field, string sentence, string oneMoreTap)
    {
        _asks.Add(new Problem(_fieldPrefix + field, sentence));
        OneMoreTap = oneMoreTap;
    }

    /// <summary>The time a form means: as stated, or now; refused where it has not come yet.</summary>
    public DateTime At(DateTime? stated, string field = "At")
    {
        var at = RecordRules.Store(stated ?? Now);
        RefuseUnless(at <= Now + ClockSlack, field, $"{Say(at)} has not come yet: check the date and the tablet's clock.");
        return at;
    }

    public Entry NewEntry(string kind, DateTime at)
    {
        var entry = new Entry
        {
            Op = Sent.Op,
            Part = _part++,
            Kind = kind,
            AtUtc = at,
            EnteredUtc = Now,
            TypedAt = Sent.TypedAt,
            PersonId = Sent.PersonId,
            Device = Sent.Device,
        };
        if (First is null)
        {
            First = entry;
            entry.BodySha256 = body;
        }

        Db.Entries.Add(entry);
        _entries.Add(entry);
        return entry;
    }

    public T Add<T>(T fact, DateTime at)
        where T : Fact => Add(fact, NewEntry(typeof(T) == typeof(VoidFact) ? "Void" : typeof(T).Name, at));

    public T Add<T>(T fact, Entry entry)
        where T : Fact
    {
        if (WhoMay.Of(typeof(T).Name) is { Role: { } role, Enforced: true })
        {
            RefuseUnlessIn(role);
        }

        fact.Entry = entry;
        Db.Add(fact);
        _facts.Add(fact);
        return fact;
    }

    /// <summary>Strikes an entry out.</summary>
    public void Void(int entryId, string reason) => Add(new VoidFact { VoidedId = entryId, Reason = reason }, Now);

    public async Task<Saw?> FindSaw(string? code, string field = "Saw")
    {
        var text = (code ?? "").Trim();
        var saw = text.Length == 0 ? null : await Db.Saws.SingleOrDefaultAsync(s => s.Code == text);
        if (saw is null)
        {
            Refuse(field, text.Length == 0 ? "Say which saw." : $"There is no saw {text}.");
        }

        return saw;
    }

    public async Task<Blade?> FindBlade(string? tag, string field = "Tag")
    {
        var text = Tags.Read(tag ?? "");
        var blade = text.Length == 0 ? null : await Db.Blades.Include(b => b.Spec).SingleOrDefaultAsync(b => b.Tag == text);
        if (blade is null)
        {
            Refuse(field, text.Length == 0 ? "Say which blade." : $"There is no blade {text}.");
        }

        return blade;
    }

    public Task<BladeNow> NowOf(Blade blade) => Db.BladesNow.AsNoTracking().SingleAsync(b => b.BladeId == blade.Id);

    public async Task<SawSetup> SetupAt(int sawId, DateTime at)
    {
        var setups = await Db.SawSetups.AsNoTracking().Include(s => s.Speeds).Include(s => s.Entry).Where(s => s.SawId == sawId).ToListAsync();
        var inOrder = setups.OrderBy(s => s.Entry.AtUtc).ThenBy(s => s.EntryId).ToList();
        return inOrder.LastOrDefault(s => s.Entry.AtUtc <= at) ?? inOrder[0];
    }

    public async Task<string> Who(int? personId) =>
        personId is null ? "somebody" : await Db.People.Where(p => p.Id == personId).Select(p => p.Initials).SingleOrDefaultAsync() ?? "somebody";

    /// <summary>A time on the shop's clock.</summary>
    public string Say(DateTime utc)
    {
        var zone = Shop?.Zone is { } id && TimeZoneInfo.TryFindSystemTimeZoneById(id, out var found) ? found : TimeZoneInfo.Utc;
        return TimeZoneInfo.ConvertTimeFromUtc(DateTime.SpecifyKind(utc, DateTimeKind.Utc), zone).ToString("d MMM yyyy HH:mm", CultureInfo.InvariantCulture);
    }

    /// <summary>A length in the shop's unit.</summary>
    public string Say(double metres) => Shop?.Lengths == LengthUnit.Inch
        ? string.Create(CultureInfo.InvariantCulture, $"{metres / Exact.Inch:#,0.###} in")
        : string.Create(CultureInfo.InvariantCulture, $"{metres * 1000:#,0.##} mm");

    private Shop? Shop => _shop ??= Db.Shops.AsNoTracking().OrderBy(s => s.Id).FirstOrDefault();

    public void RefuseUnlessIn(Role role)
    {
        var able = Db.PersonRoles.AsNoTracking()
            .Where(r => r.Role == role && r.FromUtc <= Now && (r.UntilUtc == null || r.UntilUtc > Now))
            .Join(Db.People.Where(p => p.Active), r => r.PersonId, p => p.Id, (_, p) => new { p.Id, p.Initials })
            .ToList();
        if (able.Any(p => p.Id == Sent.PersonId))
        {
            return;
        }

        var who = able.Count == 0 ? "nobody yet: give somebody that right in Setup" : string.Join(", ", able.Select(p => p.Initials).Distinct().Order(StringComparer.Ordinal));
        Refuse("Person", $"Only some may {WhoMay.Words(role)}: {who}.");
    }
}

"""When each blade was sharpened, on its saw and running. Times are minutes, 0 = midnight before today."""

import math
from dataclasses import dataclass, field

from .slots import batch_windows, interval_units, intervals, sharpening_slots, whole_shares
from .tables import BLADES, BROKE, ON_SAW_NOW, PERIODS, SAWS

DAY = 1440
MEAN_SPELL_UNITS = {"S1": 52, "S2": 43, "S3": 12, "S4": 6, "S5": 15}
GREATEST_RUN_UNITS = {"S1": 40, "S2": 40, "S3": 15, "S4": 6, "S5": 20}
HOURS_OPEN = {"S1": (480, 1020), "S2": (480, 1020), "S3": (510, 1020), "S4": (1080, 1250), "S5": (480, 1020)}
X_MAX_KM = {"hardened_carbon": 11.2, "carbide": 30.0, "bimetal": 28.0, "plain_steel": 7.0}
# A spell that must start on a given day: the crack of Q-14 and what stands on the saws today.
LAST_SPELL_DAY = {"Q-04": -264, "Q-14": -3, "Q-08": -2, "Q-01": -2, "Q-17": -2, "Q-30": -2, "Q-32": -2}


@dataclass
class Spell:
    tag: str
    saw: str
    interval: int
    units: int
    wish: float
    hours_of_interval: float
    last: bool = False     # the last before its sharpening, or the last of all
    final: bool = False    # in the interval after the last sharpening
    pieces: list = field(default_factory=list)
    parts: list = field(default_factory=list)
    on: int = 0
    off: int | None = None
    reason: str = ""


@dataclass
class Part:
    """What one spell ran inside one run."""
    spell: Spell
    units: int
    start: int
    end: int
    cuts: list = field(default_factory=list)


@dataclass
class Run:
    saw: str
    parts: list

    @property
    def start(self):
        return self.parts[0].start

    @property
    def end(self):
        return self.parts[-1].end

    @property
    def units(self):
        return sum(p.units for p in self.parts)


def works(day):
    """Five of every seven days."""
    return day % 7 not in (1, 2)


def saw_doctor_in(day):
    return day % 7 in (4, 6)


def spells_of(tag, slots, rng):
    saw = BLADES[tag]["saw"]
    spans = intervals(tag, slots)
    spells = []
    for k, ((start, end), units) in enumerate(zip(spans, interval_units(tag, spans, rng))):
        spells += _spells_in(tag, saw, k, start, end, units, k == len(spans) - 1, rng)
    if tag in LAST_SPELL_DAY:
        spells[-1].wish = LAST_SPELL_DAY[tag]
    return spells


def _spells_in(tag, saw, k, start, end, units, final, rng):
    if units == 0:
        return []
    most = 39 if tag == "Q-04b" else 70
    count = max(1, round(units / MEAN_SPELL_UNITS[saw]), math.ceil(units / most * 1.15))
    count = min(count, max(1, units // 3), 4 if tag == "Q-25" else 99)
    room = max(0.5, (end - start) - 5)
    spells = []
    for i, part in enumerate(whole_shares(units, [rng.uniform(0.85, 1.15) for _ in range(count)])):
        wish = start + 1 + (i + 0.5 + rng.uniform(-0.35, 0.35)) / count * room
        spells.append(Spell(tag, saw, k, part, wish, units / 10, last=i == count - 1, final=final))
    return spells


def lay_out(saw, spells, rng):
    """One blade after another on the saw, inside the working hours."""
    spells.sort(key=lambda s: s.wish)
    _meter_over_the_break(saw, spells)
    cursor = -10_000 * DAY
    for spell in spells:
        wished = math.floor(spell.wish) * DAY + HOURS_OPEN[saw][0]
        start = max(cursor + rng.randint(14, 40), wished + rng.randint(0, 60))
        cursor = _run_spell(saw, spell, start, rng)
    _dismount(spells)
    return spells


def _meter_over_the_break(saw, spells):
    """Q-36 broke between two readings of 1.2 h; the blade after it ran the other half."""
    for i, spell in enumerate(spells):
        if spell.tag == "Q-36" and spell.final and spell.last:
            after = next(s for s in spells[i + 1:] if s.tag != "Q-36" and not s.final and s.units >= 10)
            spells.remove(after)
            spells.insert(i + 1, after)
            after.wish = spell.wish
            spell.pieces = [spell.units - 6, 6]
            after.pieces = [6, after.units - 6]
            return


def _run_spell(saw, spell, start, rng):
    opens, closes = HOURS_OPEN[saw]
    pieces = list(spell.pieces) or [spell.units]
    broke_here = spell.tag == "Q-36" and len(pieces) == 2
    t = start
    while pieces:
        t = _next_open(saw, t)
        share = rng.uniform(0.62, 0.9)
        room = int((closes - t % DAY - 8) * share / 6)
        wanted = min(pieces[0], GREATEST_RUN_UNITS[saw])
        if room < min(3, wanted) or (wanted == 6 and room < 6):
            t = (t // DAY + 1) * DAY + opens + rng.randint(0, 45)
            continue
        units = min(wanted, room)
        begin = t + 3
        end = begin + math.ceil(units * 6 / share)
        if not spell.parts:
            spell.on = t
        spell.parts.append(Part(spell, units, begin, end))
        pieces[0] -= units
        pieces = [p for p in pieces if p]
        t = end + rng.randint(6, 25)
        if pieces and (broke_here or rng.random() < 0.6):
            t = (t // DAY + 1) * DAY + opens + rng.randint(0, 20)
    return spell.parts[-1].end + 2


def _next_open(saw, t):
    opens, closes = HOURS_OPEN[saw]
    if t % DAY < opens:
        t = t // DAY * DAY + opens
    if t % DAY > closes - 20:
        t = (t // DAY + 1) * DAY + opens
    while not works(t // DAY):
        t = (t // DAY + 1) * DAY + opens
    return t


def _dismount(spells):
    """A blade stays on the saw until the swap, unless it had to come off at once."""
    for spell, after in zip(spells, spells[1:] + [None]):
        end = spell.parts[-1].end
        if after is None and ON_SAW_NOW[spell.saw] == spell.tag:
            continue
        spell.off, spell.reason = end + 2, "still_sharp"
        if spell.tag in BROKE and spell.final and spell.last:
            spell.off, spell.reason = end, "broke"
        elif spell.tag == "Q-14" and spell.final and spell.last:
            spell.reason = "crack_or_clicking"
        elif spell.last and not spell.final:
            spell.reason = "dull"
        elif not spell.last and after is not None and after.tag != spell.tag:
            spell.off, spell.reason = max(end + 1, after.on - 10), "other_work"


def runs_of(saw, spells):
    """One run per part, except the few read once over two spells."""
    parts = [p for s in spells for p in s.parts]
    runs, used, shared = [], set(), 0
    for part, after in zip(parts, parts[1:] + [None]):
        if id(part) in used:
            continue
        if after is not None and _read_once(part, after, shared):
            used.add(id(after))
            runs.append(Run(saw, [part, after]))
            shared += part.spell.tag != "Q-36"
        else:
            runs.append(Run(saw, [part]))
    return runs


def _read_once(part, after, shared):
    if part.spell is after.spell or part.start // DAY != after.end // DAY:
        return False
    if part.spell.tag == "Q-36" and part.spell.final and part.spell.last:
        return part.spell.reason == "broke"
    near = after.start - part.end < 60
    plain = not (part.spell.final or after.spell.final or part.spell.tag == after.spell.tag)
    return near and plain and shared < 2 and part.spell.saw in ("S1", "S2", "S3") and part.spell.reason == "other_work"


def set_sharpening_times(sharpenings, spells_by_tag, batches):
    for s in sharpenings:
        before = [x for x in spells_by_tag[s.tag] if x.interval < s.number]
        later = [x for x in spells_by_tag[s.tag] if x.interval >= s.number]
        earliest = max((x.off for x in before), default=-10_000 * DAY)
        latest = min((x.on for x in later), default=-6 * DAY)
        s.at = _return_time(s, batches) if s.batch is not None else _bench_time(s, earliest, latest)
        left = batches[s.batch][0] * DAY + 9 * 60 if s.batch is not None else s.at
        assert earliest < left and s.at < latest, f"{s.tag}: sharpening {s.number} falls into a spell"


def _return_time(s, batches):
    return batches[s.batch][1] * DAY + 11 * 60 + int(s.tag[2:4]) % 45


def _bench_time(s, earliest, latest):
    """Tuesdays and Thursdays are the saw doctor's, else the next working morning."""
    days = range(earliest // DAY, latest // DAY + 1)
    for fits in (saw_doctor_in, works):
        for day in days:
            for hour in (9, 12, 15, 17):
                t = day * DAY + hour * 60 + int(s.tag[2:4])
                if fits(day) and earliest + 10 < t < latest - 10:
                    return t
    raise AssertionError(f"{s.tag}: no time on the bench for sharpening {s.number}")


def make(rng):
    batches = batch_windows()
    sharpenings, spells_by_saw, spells_by_tag = [], {s: [] for s in SAWS}, {}
    for tag in PERIODS:
        slots = sharpening_slots(tag, batches)
        spells = spells_of(tag, slots, rng)
        assert sum(s.units for s in spells) == BLADES[tag]["units"], tag
        sharpenings += slots
        spells_by_tag[tag] = spells
        spells_by_saw[BLADES[tag]["saw"]] += spells
    runs = []
    for saw, spells in spells_by_saw.items():
        lay_out(saw, spells, rng)
        runs += runs_of(saw, spells)
    set_sharpening_times(sharpenings, spells_by_tag, batches)
    return batches, sharpenings, spells_by_saw, runs

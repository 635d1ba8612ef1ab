"""The cut log: what each run sawed. The wood path since the last sharpening comes out as the table says."""

from dataclasses import dataclass

from .plan import X_MAX_KM
from .tables import BLADES, SAWS, SPECS

# species, wear multiplier, moisture, dirt, dirt multiplier: the last of each list is the reference wood
WOODS = {
    "S1": [("European oak", 1.5, 14, "clean", 1), ("European larch", 1.0, 16, "clean", 1),
           ("Scots pine", 0.7, 14, "reclaimed", 2), ("sugar maple", 1.5, 10, "clean", 1),
           ("Douglas-fir (coast)", 1.0, 15, "clean", 1)],
    "S2": [("European oak", 1.5, 11, "clean", 1), ("sugar maple", 1.5, 8, "clean", 1),
           ("Norway spruce", 0.7, 9, "clean", 1), ("European ash", 1.5, 10, "clean", 1),
           ("black walnut", 1.0, 9, "clean", 1), ("black cherry", 1.0, 9, "clean", 1)],
    "S3": [("European oak", 1.5, 10, "clean", 1), ("yellow-poplar", 0.7, 9, "clean", 1),
           ("black walnut", 1.0, 12, "clean", 1), ("birch plywood", 4.0, 9, "clean", 1),
           ("black cherry", 1.0, 9, "clean", 1)],
    "S4": [("yellow-poplar", 0.7, 9, "clean", 1), ("Norway spruce", 0.7, 9, "clean", 1),
           ("black cherry", 1.0, 9, "clean", 1)],
    "S5": [("European ash", 1.5, 45, "bark_on", 2), ("European oak", 1.5, 55, "bark_on", 2),
           ("Scots pine", 0.7, 60, "bark_on", 2), ("European larch", 1.0, 50, "clean", 1),
           ("Douglas-fir (coast)", 1.0, 40, "clean", 1)],
}
TONEWOODS = [("Indian rosewood", 3.0, 8, "clean", 1), ("Norway spruce", 0.7, 8, "clean", 1)]
LENGTHS_MM = {"S1": (900, 1500, 2400, 3000, 4200), "S2": (600, 900, 1200, 1500, 1800, 2400),
              "S3": (300, 400, 600, 800, 1200), "S4": (200, 300, 400), "S5": (2400, 2700, 3000, 3600, 4800)}
FEEDS = {"S1": (1.5, 2, 2.5, 3), "S2": (1.5, 2, 2.5, 3, 4), "S3": (1, 1.5, 2), "S4": (0.8, 1, 1.5),
         "S5": (6, 8, 9, 10)}
HEIGHTS_MM = {"S1": (18, 300), "S2": (10, 300), "S3": (8, 180), "S4": (4, 60), "S5": (110, 460)}
LOGGED_SHARE = {"S1": 0.36, "S3": 0.42, "S4": 0.40, "S5": 0.62}
OSPREY_SHARE = 0.41
LINES_PER_H = {"S1": 1.0, "S2": 1.40, "S3": 4.0, "S4": 4.5, "S5": 3.2}
OPERATORS = {"S1": ("RU", "RU", "JP"), "S2": ("JP", "JP", "RU"), "S3": ("JP", "IC", "PR"),
             "S4": ("CLASS", "CLASS", "PR"), "S5": ("RU", "RU", "PR")}


@dataclass
class Cut:
    wood: tuple
    height_mm: int
    length_mm: int
    pieces: int
    feed: float
    grade: str
    nail: bool = False
    at: int = 0
    who: str = ""

    @property
    def ms(self):
        return round(self.length_mm * self.pieces * 60 / self.feed)

    @property
    def area_mm2(self):
        return self.height_mm * self.length_mm * self.pieces


def path_km(saw, cut):
    """A v/(f L): the wood one tooth has passed through."""
    _, _, v, loop, _ = SAWS[saw]
    return cut.area_mm2 * 1e-6 * v / (cut.feed / 60 * loop / 1000) / 1000


def seed_area_mm2(tag):
    """The area of reference wood at the reference feed that gives the path of the table."""
    _, _, v, loop, feed = SAWS[BLADES[tag]["saw"]]
    return BLADES[tag]["path_km"] * 1000 / (v / (feed / 60 * loop / 1000)) * 1e6


def fill(runs, spells_by_saw, rng):
    for run in runs:
        if len(run.parts) > 1:
            _even_lines(run, rng)
    for spells in spells_by_saw.values():
        for tag in sorted({s.tag for s in spells}):
            _seed(tag, [p for s in spells if s.tag == tag and s.final for p in s.parts], rng)
    share = _share_of_ordinary_runs(runs)
    for run in runs:
        for part in run.parts:
            if not part.spell.final and not part.cuts:
                _ordinary(run.saw, part, share[run.saw], rng)
    for run in runs:
        for part in run.parts:
            _time_lines(run.saw, part, rng)


def _even_lines(run, rng):
    """A run over two spells is divided by cutting minutes: they stand here exactly as the hours do."""
    mill = run.saw == "S5"
    length, feed, height = (4000, 8, 300) if mill else (1000, 2, rng.randint(24, 40))
    for part in run.parts:
        part.cuts = [Cut(WOODS[run.saw][-1], height, length, 5 * part.units, feed, "timed")]


def _seed(tag, parts, rng):
    rest = seed_area_mm2(tag) - sum(c.area_mm2 for p in parts for c in p.cuts)
    open_parts = [p for p in parts if not p.cuts]
    if rest < 1:
        return
    saw = BLADES[tag]["saw"]
    units = sum(p.units for p in open_parts)
    height = _seed_height(saw, tag, rest, units)
    for i, part in enumerate(open_parts):
        lines = max(1, round(part.units / 10 * LINES_PER_H[saw]))
        for k in range(lines):
            final = i == len(open_parts) - 1 and k == lines - 1
            area = rest if final else rest * (part.units / units) / (lines - k)
            cut = _seed_line(saw, area, height if lines == 1 else round(height * rng.uniform(0.94, 1.06)), final)
            part.cuts.append(cut)
            rest -= cut.area_mm2
        units -= part.units


def _seed_height(saw, tag, area_mm2, units):
    """High enough that the lines fit the running time with room to spare."""
    feed = SAWS[saw][4]
    minutes = units * 6 * (0.78 if tag == "Q-32" else 0.45)
    low, high = HEIGHTS_MM[saw]
    return round(min(high, max(low, area_mm2 / (feed * 1000 * minutes))))


def _seed_line(saw, area_mm2, height, final):
    lengths = LENGTHS_MM[saw]
    length = lengths[height % len(lengths)]
    pieces = max(1, round(area_mm2 / height / length))
    if final:
        height, length, pieces = _closest(area_mm2, height, pieces)
    elif area_mm2 / height < length:
        length = max(1, round(area_mm2 / height / pieces))
    return Cut(WOODS[saw][-1], height, length, pieces, SAWS[saw][4], "timed")


def _closest(area_mm2, height, pieces):
    """Whole millimetres and pieces near the wanted ones whose area misses by the least."""
    tries = [(h, max(1, round(area_mm2 / h / n)), n)
             for h in range(max(1, height - 3), height + 4) for n in range(max(1, pieces - 2), pieces + 3)]
    return min(tries, key=lambda t: abs(t[0] * t[1] * t[2] - area_mm2))


def _share_of_ordinary_runs(runs):
    """On Osprey the cut log must account for 41 % of the running, the fixed lines included."""
    parts = [p for r in runs if r.saw == "S2" for p in r.parts]
    fixed = sum(c.ms for p in parts for c in p.cuts)
    free = sum(p.units for p in parts if not p.cuts and not p.spell.final) * 360_000
    total = sum(p.units for p in parts) * 360_000
    return {**LOGGED_SHARE, "S2": (OSPREY_SHARE * total - fixed) / free}


def _ordinary(saw, part, share, rng):
    spell = part.spell
    hours = part.units / 10
    lines = max(1, round(hours * LINES_PER_H[saw] + rng.uniform(-0.4, 0.4)))
    minutes = hours * 60 * share * (1 if saw == "S2" else rng.uniform(0.85, 1.15)) / lines
    height = _usual_height(saw, spell, share)
    for _ in range(lines):
        wood = _wood(saw, spell.tag, rng)
        feed = rng.choice(FEEDS[saw])
        length, pieces = _pieces(saw, minutes * feed * 1000, rng)
        low, high = HEIGHTS_MM[saw]
        tall = round(min(high, max(low, height * rng.uniform(0.65, 1.35))))
        part.cuts.append(Cut(wood, tall, length, pieces, feed, rng.choice(("typed", "typed", "timed", "assumed"))))


def _usual_height(saw, spell, share):
    """Such that a blade is about dull when it goes to the sharpener."""
    _, _, v, loop, _ = SAWS[saw]
    target_km = 0.8 * X_MAX_KM[SPECS[BLADES[spell.tag]["spec"]]["tooth"]]
    cutting_s = spell.hours_of_interval * 3600 * share
    wear = sum(w[1] * w[4] for w in WOODS[saw]) / len(WOODS[saw])
    return target_km * 1e6 / (cutting_s * v / (loop / 1000)) / wear


def _wood(saw, tag, rng):
    if tag == "Q-13" and rng.random() < 0.7:
        return rng.choice(TONEWOODS)
    return rng.choice(WOODS[saw])


def _pieces(saw, total_mm, rng):
    length = rng.choice(LENGTHS_MM[saw])
    pieces = max(1, round(total_mm / length))
    length = max(50, round(total_mm / pieces / 10) * 10)
    if length > max(LENGTHS_MM[saw]):
        pieces += 1
        length = max(50, round(total_mm / pieces / 10) * 10)
    return length, pieces


def _time_lines(saw, part, rng):
    """Each line is logged when it is done, in the order of the work."""
    who = rng.choice(OPERATORS[saw])
    if part.spell.tag == "Q-13":
        who = "IC"
    room = part.end - part.start
    assert sum(c.ms for c in part.cuts) <= part.units * 360_000, f"{part.spell.tag}: more cutting than running"
    for i, cut in enumerate(part.cuts):
        cut.at = part.start + max(1, round(room * (i + 1) / (len(part.cuts) + 1)))
        cut.who = who
        assert part.start <= cut.at <= part.end


def strike_a_nail(spells):
    """What ended Q-39: its last line."""
    last = [s for s in spells if s.tag == "Q-39"][-1].parts[-1].cuts[-1]
    last.nail = True


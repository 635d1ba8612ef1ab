"""Who looked at which blade when: 655 inspections, 38 of them later than they were due."""

from .plan import DAY
from .tables import BLADES, BROKE, INSPECT_EVERY_H, ON_SAW_NOW, OPEN_BATCH_TAGS

TOTAL = 655
LATE = 38


class Blade:
    """The running and the chances to look at one blade, in time order."""

    def __init__(self, tag, spells, sharpened, cracked):
        self.tag = tag
        self.due = float(BLADES[tag]["inspect"]) if BLADES[tag]["inspect"].isdigit() else INSPECT_EVERY_H
        parts = [p for s in spells for p in s.parts]
        self.runs = [(p.end, p.units / 10) for p in parts]
        self.fixed = {t + 12 for t in sharpened} | cracked | self._at_the_end(spells)
        self.at_mount = {s.on - 5 for s in spells} - self.fixed
        self.mornings = {b.start - 2 for s in spells for a, b in zip(s.parts, s.parts[1:]) if a.start // DAY != b.start // DAY}
        self.chosen = self.fixed | self.at_mount

    def _at_the_end(self, spells):
        if self.tag in BROKE or self.tag in OPEN_BATCH_TAGS:
            return set()
        on_saw = self.tag in ON_SAW_NOW.values()
        return {spells[-1].parts[-1].end + 4 if on_saw else spells[-1].off + 8}

    def late(self, chosen=None):
        """How many looks came after more running than the rule allows."""
        events = sorted([(t, 0, h) for t, h in self.runs] + [(t, 1, 0) for t in chosen or self.chosen])
        since, count = 0.0, 0
        for _, look, hours in events:
            if look:
                count += since > self.due + 1e-9
                since = 0.0
            since += hours
        return count


def choose(spells_by_tag, sharpenings, cracks, rng):
    blades = [Blade(tag, spells, [s.at for s in sharpenings if s.tag == tag], {t for b, t in cracks if b == tag})
              for tag, spells in sorted(spells_by_tag.items())]
    assert sum(b.late() for b in blades) == 0
    _forget_some(blades, rng)
    _fill_up(blades, rng)
    assert sum(len(b.chosen) for b in blades) == TOTAL and sum(b.late() for b in blades) == LATE
    return {b.tag: sorted(b.chosen) for b in blades}


def _forget_some(blades, rng):
    """A look left out here and there makes the next one late."""
    chances = [(b, t) for b in blades if b.tag != "Q-06" for t in sorted(b.at_mount)]
    rng.shuffle(chances)
    late = 0
    for blade, t in chances:
        if late == LATE:
            return
        without = blade.chosen - {t}
        if blade.late(without) == blade.late() + 1:
            blade.chosen = without
            late += 1


def _fill_up(blades, rng):
    missing = TOTAL - sum(len(b.chosen) for b in blades)
    kind = (lambda b: b.mornings - b.chosen) if missing > 0 else (lambda b: b.at_mount & b.chosen)
    chances = [(b, t) for b in blades if b.tag != "Q-06" for t in sorted(kind(b))]
    rng.shuffle(chances)
    for blade, t in chances:
        if missing == 0:
            return
        changed = blade.chosen ^ {t}
        if blade.late(changed) == blade.late():
            blade.chosen = changed
            missing += -1 if missing > 0 else 1

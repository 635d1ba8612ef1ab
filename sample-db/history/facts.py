"""Turns the plan into the rows of the CSV files."""

from .book import day_time
from .cuts import OPERATORS
from .plan import DAY, works
from .tables import BLADES, BROKE, FIRST_DAY, KERF_READINGS, OPEN_BATCH, OPEN_BATCH_TAGS, PERIODS, RUN_SOURCE, SAWS, SPECS, UNIT_MS

# The first reading of each hour meter; Osprey's and Longreach's follow from the stories.
OLD_HERON_FIRST = 6204.3
OSPREY_LAST_OF_OLD_METER = 1842.6
LONGREACH_READING = 381.4
LONGREACH_TYPED = 318.4


def month(number):
    """First and last day of a month of the history."""
    return round(-548 + (number - 1) * 30.44), round(-548 + number * 30.44) - 1


def mounts(book, spells_by_saw, rng):
    rows = {}
    for saw, spells in spells_by_saw.items():
        for spell in spells:
            row = _mount(book, spell, spell.tag, spell.on, rng.choice(OPERATORS[saw]))
            rows[id(spell)] = row
    return rows


def _mount(book, spell, tag, learned, who):
    tension = SPECS[BLADES[spell.tag]["spec"]]["tension"]
    return book.add(
        "mounts", learned, saw=spell.saw, tag=tag, **day_time(spell.on), **day_time(spell.off, "off_"),
        off_reason=spell.reason, tension_mpa=tension, tension_grade="measured", inside_out="no", who=who,
        **day_time(learned if learned != spell.on else None, "entered_"))


def label_clash(book, spells_by_saw, mount_rows):
    """Q-25 stood in the book as Q-24 for twelve days: voided and entered again under its own number."""
    spells = [s for s in spells_by_saw["S3"] if s.tag == "Q-25"]
    found = (spells[0].on // DAY + 12) * DAY + 16 * 60
    while not works(found // DAY):
        found += DAY
    for n, spell in enumerate(spells):
        row = mount_rows[id(spell)]
        wrong = _mount(book, spell, "Q-24", spell.on, row["who"])
        row.update(day_time(found + 6 + n, "entered_"))
        _learn_later(book, "mounts", row, found + 6 + n)
        _void(book, wrong, found + 5, "labels 24 and 25 exchanged: it was Q-25, told apart by width", "OT")
    book.add("retags", found, tag_on_label="Q-24", tag="Q-25", **day_time(found), who="OT",
             reason="two blades labelled 24; the 10 mm one is Q-25; 4 h re-assigned")


def _learn_later(book, name, row, learned):
    book.rows[name] = [(learned if r is row else t, n, r) for t, n, r in book.rows[name]]


def _void(book, row, at, reason, who):
    book.add("voids", at, voids=row, **day_time(at), reason=reason, who=who)


def runs_and_meters(book, runs, rng):
    for saw in SAWS:
        own = sorted((r for r in runs if r.saw == saw), key=lambda r: r.start)
        readings = _meter(book, saw, own, rng) if SAWS[saw][1] else {}
        grade, source = RUN_SOURCE[saw]
        for run in own:
            book.add("runs", run.end, saw=saw, **day_time(run.start, "from_"), **day_time(run.end, "until_"),
                     running_ms=run.units * UNIT_MS, speed_m_s=SAWS[saw][2], grade=grade, source=source,
                     meter_reading=readings.get(id(run), ""), who=rng.choice(OPERATORS[saw]))


def _meter(book, saw, runs, rng):
    """One reading at the end of every run; each epoch is one physical meter."""
    new_meter = _first_in_month(runs, 7) if saw == "S2" else None
    typo = _first_in_month(runs, 11) if saw == "S5" else None
    tenths = _first_reading(saw, runs, new_meter, typo)
    epoch = _epoch(book, saw, runs[0].start - 30, tenths, "first", "")
    readings = {}
    for run in runs:
        if run is new_meter:
            assert tenths == round(OSPREY_LAST_OF_OLD_METER * 10)
            epoch = _epoch(book, saw, run.start - 8, 0, "new_meter", tenths / 10)
            tenths = 0
        tenths += run.units
        who = rng.choice(OPERATORS[saw])
        if run is typo:
            readings[id(run)] = _typing_error(book, epoch, run, who)
        else:
            readings[id(run)] = _reading(book, epoch, run, tenths / 10, run.end, who)
    return readings


def _first_in_month(runs, number):
    first, last = month(number)
    return next(r for r in runs if first + 6 <= r.start // DAY <= last)


def _first_reading(saw, runs, new_meter, typo):
    if saw == "S2":
        return round(OSPREY_LAST_OF_OLD_METER * 10) - sum(r.units for r in runs[: runs.index(new_meter)])
    if saw == "S5":
        return round(LONGREACH_READING * 10) - sum(r.units for r in runs[: runs.index(typo) + 1])
    return round(OLD_HERON_FIRST * 10)


def _epoch(book, saw, at, tenths, reason, last_before):
    return book.add("meter_epochs", at, saw=saw, **day_time(at), first_reading_h=tenths / 10, reason=reason,
                    last_reading_before_h=last_before, who="MI")


def _reading(book, epoch, run, value, learned, who):
    return book.add("meter_readings", learned, epoch=epoch, saw=run.saw, **day_time(run.end), reading_h=value, who=who,
                    **day_time(learned if learned != run.end else None, "entered_"))


def _typing_error(book, epoch, run, who):
    wrong = _reading(book, epoch, run, LONGREACH_TYPED, run.end, who)
    seen = (run.end // DAY + 1) * DAY + 8 * 60
    _void(book, wrong, seen, "typed 318.4 for 381.4", "MI")
    return _reading(book, epoch, run, LONGREACH_READING, seen + 1, "MI")


def cuts(book, runs):
    for run in runs:
        for part in run.parts:
            for c in part.cuts:
                species, _, moisture, dirt, _ = c.wood
                book.add("cuts", c.at, saw=run.saw, **day_time(c.at), tag=part.spell.tag, species=species,
                         height_mm=c.height_mm, length_mm=c.length_mm, pieces=c.pieces, feed_m_min=float(c.feed),
                         feed_grade=c.grade, moisture_pct=moisture, frozen="no", dirt=dirt,
                         nail="yes" if c.nail else "no", who=c.who)


def sharpenings(book, all_sharpenings, batches):
    crack = _ground_out(all_sharpenings)
    for j, (sent, _) in enumerate(batches):
        _batch(book, f"B-{18 + j:03d}", sent)
    for tag in sorted({s.tag for s in all_sharpenings}):
        own = [s for s in all_sharpenings if s.tag == tag]
        for s, width in zip(own, _widths(tag, own)):
            _sharpening(book, s, width, s is crack)
            if s.batch is not None:
                _there_and_back(book, s, width, batches[s.batch][0])
    _open_batch(book)


def _widths(tag, own):
    """The measured width falls with every grind, a whole new profile taking more than a face."""
    blade = BLADES[tag]
    takes = [1.0 if s.batch is not None else 0.7 for s in own]
    if tag == "Q-38":
        takes[-1] = 2.4                      # the deep grind that ended it
    loss = blade["width_new"] - blade["width"]
    widths = [round(blade["width_new"] - loss * sum(takes[: i + 1]) / sum(takes), 1) for i in range(len(takes))]
    assert abs(widths[-1] - blade["width"]) < 1e-9
    return widths


def _sharpening(book, s, width, crack):
    spec = SPECS[BLADES[s.tag]["spec"]]
    service = s.batch is not None
    full = service or crack or s.number % 3 == 0
    again = spec["tips"] == "set" and full
    return book.add(
        "sharpenings", s.at, tag=s.tag, **day_time(s.at), kind="full_profile" if full else "face",
        set_again="yes" if again else "no", width_mm=width, gullet_mm=spec["gullet_mm"], kerf_mm=spec["kerf_mm"],
        edge_um=spec["edge_um"], price_minor=spec["sharpening"] if service else spec["sharpening"] // 2,
        batch=f"B-{18 + s.batch:03d}" if service else "", who="MI" if service else "OT")


def _batch(book, number, sent):
    book.add("batches", sent * DAY + 540, batch=number, service="the grinding service", **day_time(sent * DAY + 540),
             promised_day=sent + 9, who="MI")


def _there_and_back(book, s, width, sent):
    number = f"B-{18 + s.batch:03d}"
    book.add("batch_lines", sent * DAY + 540, batch=number, tag=s.tag, wanted="full_profile", note="")
    book.add("returns", s.at - 10, batch=number, tag=s.tag, **day_time(s.at - 10), outcome="sharpened", width_mm=width, who="MI")


def _open_batch(book):
    _batch(book, OPEN_BATCH, -6)
    notes = {"Q-07": "two tips low since the last batch, ground again free of charge"}
    for tag in OPEN_BATCH_TAGS:
        note = notes.get(tag, "touched up here, wants the whole profile and the set")
        book.add("batch_lines", -6 * DAY + 540, batch=OPEN_BATCH, tag=tag, wanted="full_profile", note=note)


def kerf_readings(book, all_sharpenings):
    """Kerf and set measured after a sharpening, 0 being the last one."""
    for tag, after, how, kerf, left, right, note, who in KERF_READINGS:
        own = [s for s in all_sharpenings if s.tag == tag]
        at = own[after - 1].at + 40
        book.add("kerf_readings", at, tag=tag, **day_time(at), how=how, kerf_mm=kerf, set_left_mm=left, set_right_mm=right,
                 note=note, who=who)


BREAKS = {  # tag: site, moment, damage, minutes lost, note
    "Q-04": ("weld", "start", "none", 35, "went as the wheels came up to speed"),
    "Q-22": ("gullet", "in_cut", "none", 30, "too thick for the wheel"),
    "Q-23": ("gullet", "in_cut", "none", 25, "end of its expected life"),
    "Q-26": ("gullet", "in_cut", "none", 20, "in class"),
    "Q-27": ("gullet", "in_cut", "none", 20, "in class"),
    "Q-28": ("gullet", "idle", "tyre", 20, "in class; tyre cut, 31.00"),
    "Q-29": ("gullet", "in_cut", "none", 20, "in class"),
    "Q-36": ("gullet", "in_cut", "none", 40, "written down two days late: somewhere between two readings"),
    "Q-37": ("back_edge", "in_cut", "none", 45, "thrust guide pressed too far; not a fatigue break"),
}


def breaks(book, spells_by_tag):
    for tag in BROKE:
        spell = spells_by_tag[tag][-1]
        site, moment, damage, lost, note = BREAKS[tag]
        hours = BLADES[tag]["units"] / 10
        low, high = (15.2, 16.4) if tag == "Q-36" else (hours, hours)
        earliest = spell.parts[-1].start if tag == "Q-36" else spell.off
        learned = spell.off + (2 * DAY if tag == "Q-36" else 0)
        book.add("breaks", learned, saw=spell.saw, tag=tag, **day_time(spell.off), **day_time(earliest, "earliest_"),
                 **day_time(spell.off, "latest_"), hours_low=low, hours_high=high, site=site, moment=moment, damage=damage,
                 minutes_lost=lost, note=note, who="PR" if tag == "Q-36" else "JP" if spell.saw != "S4" else "CLASS",
                 **day_time(learned if learned != spell.off else None, "entered_"))


def ends_and_joints(book, spells_by_tag):
    for tag, reason, who in (("Q-38", "width_limit", "OT"), ("Q-39", "teeth_stripped", "OT")):
        at = spells_by_tag[tag][-1].off + 30
        note = "under its least width after a deep grind" if tag == "Q-38" else "nail: 40 teeth stripped"
        book.add("retirements", at, tag=tag, **day_time(at), reason=reason, cut_up="yes", note=note, who=who)
    for tag in ("Q-14", "Q-28", "Q-29"):     # Q-14 is of a specification that otherwise comes in Old Heron's length
        at = (spells_by_tag[tag][0].on // DAY - 1) * DAY + 15 * 60
        _joint(book, tag, at, SAWS[BLADES[tag]["saw"]][3], 1, "good", "made up from coil")
    cut_down = spells_by_tag["Q-04"][-1].off + 5 * DAY
    book.add("splits", cut_down, parent="Q-04", child="Q-04b", **day_time(cut_down), cut_out_mm=615, width_mm=BLADES["Q-04"]["width"], who="OT")
    _joint(book, "Q-04b", cut_down + 40, 5075, 2, "doubtful", "shortened after the break at its first weld")
    at = spells_by_tag["Q-06"][0].on - DAY
    book.add("prior_use", at, tag="Q-06", **day_time(at), low_used=0.2, high_used=0.6, width_mm=22.1,
             sharpenings_before="", source="came with the saw, history unknown", who="MI")


def _joint(book, tag, at, loop, number, quality, note):
    book.add("joints", at, tag=tag, **day_time(at), loop_mm=loop, joint_number=number, quality=quality,
             method="butt welded", annealed="yes", dressed="yes", note=note, who="OT")


def holds(book, all_sharpenings, spells_by_tag):
    """One crack ground out in month 5, one open since three days."""
    s = _ground_out(all_sharpenings)
    before = [x for x in spells_by_tag[s.tag] if x.interval < s.number][-1]
    found = before.off + 9
    hold = _hold(book, s.tag, found, 0.8, "found when it came off")
    cleared = s.at + 20
    book.add("holds_cleared", cleared, hold=hold, tag=s.tag, **day_time(cleared), how="ground out", who="OT")
    spell = spells_by_tag["Q-14"][-1]
    _hold(book, "Q-14", spell.off + 9, 2.6, "after clicking was heard")
    return {(s.tag, found - 1): 0.8, ("Q-14", spell.off + 8): 2.6}


def _ground_out(all_sharpenings):
    """The grind on the shop's own bench in month 5 that took a small crack away."""
    first, last = month(5)
    return next(s for s in all_sharpenings if s.batch is None and first <= s.at // DAY <= last)


def _hold(book, tag, at, crack, note):
    return book.add("holds", at, tag=tag, **day_time(at), kind="crack", crack_mm=crack, place="gullet", note=note, who="OT")


def hangs(book, spells_by_tag, all_sharpenings):
    """Where each blade was put away last."""
    for tag, blade in BLADES.items():
        if blade["hook"]:
            ends = [s.off + 15 for s in spells_by_tag.get(tag, [])] + [s.at + 15 for s in all_sharpenings if s.tag == tag]
            at = max(ends, default=stock_day(tag) * DAY + 600)
            book.add("hangs", at, tag=tag, **day_time(at), place="rack", hook=blade["hook"], who="OT" if ends else "MI")


def stock_day(tag):
    if tag == "Q-24":
        return PERIODS["Q-25"][0] - 2        # lay beside the blade it shared its label with
    return max(PERIODS.get(tag, (-60,))[0] - 1, FIRST_DAY)


def inspections(book, chosen, cracks, rng):
    for tag, times in chosen.items():
        for t in times:
            crack = cracks.get((tag, t))
            who = "OT" if crack else rng.choice(("OT", "JP", "RU", "JP"))
            book.add("inspections", t, tag=tag, **day_time(t), finding="crack" if crack else "nothing_seen",
                     crack_mm=crack or "", place="gullet" if crack else "", who=who)


def tension_checks(book, spells_by_saw, mount_rows, rng, count=212):
    spells = [s for own in spells_by_saw.values() for s in own]
    for spell in rng.sample(spells, count):
        at = spell.on + 2
        book.add("tension_readings", at, saw=spell.saw, tag=spell.tag, mount=mount_rows[id(spell)], **day_time(at),
                 tension_mpa=SPECS[BLADES[spell.tag]["spec"]]["tension"], method="gauge", who=rng.choice(OPERATORS[spell.saw]))

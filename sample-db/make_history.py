#!/usr/bin/env python3
"""Writes the CSV files of the invented shop, or re-adds them from scratch with --check.

Run it in any folder: python3 sample-db/make_history.py [--check]
The same seed gives the same files on every machine.
"""

import random
import sys
from pathlib import Path

sys.dont_write_bytecode = True     # nothing but the CSV files is left behind

from history import check, cuts, facts, inspections, plan, shift, tables
from history.book import Book, figure, write_csv, write_lines

FOLDER = Path(__file__).resolve().parent
SEED = 1


def main():
    if "--check" not in sys.argv[1:]:
        make(FOLDER)
    check.check(FOLDER)


def make(folder):
    rng = random.Random(SEED)
    batches, sharpenings, spells_by_saw, runs = plan.make(rng)
    cuts.fill(runs, spells_by_saw, rng)
    spells_by_tag = {t: [s for own in spells_by_saw.values() for s in own if s.tag == t] for t in tables.PERIODS}
    cuts.strike_a_nail(spells_by_tag["Q-39"])
    write_things(folder)
    write_facts(folder, batches, sharpenings, spells_by_saw, spells_by_tag, runs, rng)


def write_facts(folder, batches, sharpenings, spells_by_saw, spells_by_tag, runs, rng):
    book = Book()
    mount_rows = facts.mounts(book, spells_by_saw, rng)
    facts.label_clash(book, spells_by_saw, mount_rows)
    facts.runs_and_meters(book, runs, rng)
    facts.cuts(book, runs)
    facts.sharpenings(book, sharpenings, batches)
    facts.kerf_readings(book, sharpenings)
    facts.breaks(book, spells_by_tag)
    facts.ends_and_joints(book, spells_by_tag)
    facts.hangs(book, spells_by_tag, sharpenings)
    cracks = facts.holds(book, sharpenings, spells_by_tag)
    chosen = inspections.choose(spells_by_tag, sharpenings, cracks, rng)
    facts.inspections(book, chosen, cracks, rng)
    facts.tension_checks(book, spells_by_saw, mount_rows, rng)
    shift.trainings(book)
    shift.handovers(book)
    book.write(folder)


def write_things(folder):
    write_csv(folder, "shop", ["key", "value"], [{"key": k, "value": v} for k, v in tables.SHOP])
    people = ["initials", "name", "may_clear_holds", "may_sharpen", "may_weld", "since_day"]
    write_csv(folder, "people", people, [dict(zip(people, (*p, tables.FIRST_DAY))) for p in tables.PEOPLE])
    write_csv(folder, "saws", ["code", "name", "has_hour_meter"],
              [{"code": c, "name": s[0], "has_hour_meter": "yes" if s[1] else "no"} for c, s in tables.SAWS.items()])
    setups = [f"f-{n:02d},{tables.FIRST_DAY},00:00,{line}" for n, line in enumerate(tables.SETUPS, 1)]
    write_lines(folder, "setups", ["ref", "day", "time", *tables.SETUP_HEADINGS], setups)
    write_csv(folder, "specs", list(spec_row(next(iter(tables.SPECS.values())))), map(spec_row, tables.SPECS.values()))
    write_csv(folder, "blades", list(blade_row(tables.BLADES["Q-01"])), map(blade_row, tables.BLADES.values()))
    species = ["species", "key", "material_kind", "wood_class"]
    write_csv(folder, "species", species, [dict(zip(species, s)) for s in tables.SPECIES])
    write_lines(folder, "queue", tables.QUEUE_HEADINGS, tables.QUEUE)


def spec_row(s):
    plain = {
        "spec": s["spec"], "width_mm": s["width_mm"], "body_mm": s["body_mm"], "pitch_coarse_mm": s["pitch_coarse_mm"],
        "pitch_fine_mm": s["pitch_fine_mm"], "tooth_form": s["form"], "hook_deg": s["hook_deg"],
        "gullet_depth_mm": s["gullet_mm"], "kerf_mm": s["kerf_mm"], "set_pattern": "alternate" if s["tips"] == "set" else "none",
        "tip_kind": s["tips"], "tip_material": s["tooth"], "body_steel": s["steel"], "body_hrc": s["hrc"],
        "new_loop_mm": s["loop"], "tension_mpa": s["tension"], "least_width_mm": 0.75 * s["width_mm"],
        "sharpening_price_minor": s["sharpening"], "most_sharpenings": s["most"], "edge_um": s["edge_um"],
        "price_minor": s["price"]}
    return {k: figure(v) for k, v in plain.items()}


def blade_row(b):
    return {"tag": b["tag"], "spec": b["spec"], "parent": "Q-04" if b["tag"] == "Q-04b" else "",
            "folded": b["folded"], "inspect_every_h": tables.INSPECT_EVERY_H if b["inspect"] in ("", "mount") else b["inspect"],
            "inspect_each_mount": "yes" if b["inspect"] == "mount" else "no",
            "stock_day": facts.stock_day(b["tag"])}


if __name__ == "__main__":
    main()

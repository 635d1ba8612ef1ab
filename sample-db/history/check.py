"""Reads the CSV files back and adds everything up again, knowing nothing of how they were made."""

import csv
from collections import Counter, defaultdict

from .tables import BLADES, BROKE, INSPECT_EVERY_H, ON_SAW_NOW, OPEN_BATCH, OPEN_BATCH_TAGS, SAWS, SPECS

DAY = 1440


class Files:
    def __init__(self, folder):
        self.folder = folder
        self.voided = {r["voids"] for r in self._read("voids")}
        self.cuts_by_saw = defaultdict(list)
        for c in self.cuts:
            self.cuts_by_saw[c["saw"]].append((at(c), c))

    def _read(self, name):
        with open(self.folder / f"{name}.csv", newline="", encoding="utf-8") as file:
            return list(csv.DictReader(file))

    def __getattr__(self, name):
        rows = [r for r in self._read(name) if r.get("ref") not in self.voided]
        setattr(self, name, rows)
        return rows


def at(row, prefix=""):
    if row[prefix + "day"] == "":
        return None
    hour, minute = row[prefix + "time"].split(":")
    return int(row[prefix + "day"]) * DAY + int(hour) * 60 + int(minute)


def require(ok, sentence):
    if not ok:
        raise SystemExit("sample-db: " + sentence)


def check(folder):
    files = Files(folder)
    spells = read_spells(files)
    check_spells(spells)
    shares, two = divide(files, spells)
    check_hours(shares)
    check_meters(files)
    check_cuts(files, spells)
    check_paths(files)
    check_sharpenings(files, spells)
    check_kerf_readings(files)
    check_loops(files)
    check_away_and_held(files, spells)
    check_inspections(files, spells, shares)
    check_trainings(files)
    check_counts(files, two)
    check_past(files)
    print(f"sample-db: {len(spells)} spells, {len(files.runs)} runs ({two} over two spells), "
          f"{len(files.cuts)} cut lines; all adds up")


def read_spells(files):
    spells = []
    for r in files.mounts:
        spells.append({"ref": r["ref"], "saw": r["saw"], "tag": r["tag"], "on": at(r), "off": at(r, "off_")})
        target = SPECS[BLADES[r["tag"]]["spec"]]["tension"]
        require(float(r["tension_mpa"]) == target, f"{r['ref']} is not at the target tension")
        require(r["saw"] == BLADES[r["tag"]]["saw"], f"{r['ref']}: {r['tag']} is on the wrong saw")
    return sorted(spells, key=lambda s: s["on"])


def check_spells(spells):
    for key in ("saw", "tag"):
        for name in {s[key] for s in spells}:
            own = [s for s in spells if s[key] == name]
            for a, b in zip(own, own[1:]):
                require(a["off"] is not None and a["on"] < a["off"] <= b["on"], f"{a['ref']} and {b['ref']} overlap on {name}")
    require({s["saw"]: s["tag"] for s in spells if s["off"] is None} == ON_SAW_NOW, "the wrong blades are on the saws")


def divide(files, spells):
    """Milliseconds of each run for each spell; two spells share by their cutting time."""
    shares, two = defaultdict(int), 0
    per_saw = defaultdict(list)
    for r in files.runs:
        start, end, ms = at(r, "from_"), at(r, "until_"), int(r["running_ms"])
        require(0 < ms <= (end - start) * 60_000, f"{r['ref']} ran longer than it lasted")
        inside = [s for s in spells if s["saw"] == r["saw"] and s["on"] < end and (s["off"] is None or s["off"] > start)]
        windows = [(max(s["on"], start), min(s["off"] or end, end)) for s in inside]
        cutting = [sum(map(cut_ms, cuts_in(files, r["saw"], *w))) for w in windows]
        require(1 <= len(inside) <= 2, f"{r['ref']} lies in {len(inside)} spells")
        if len(inside) == 2:
            two += 1
            require(min(cutting) > 0, f"{r['ref']} lies in two spells without cuts in both")
            first = ms * cutting[0] / sum(cutting)
            require(first == int(first), f"{r['ref']} does not divide into whole milliseconds")
            parts = [int(first), ms - int(first)]
        else:
            require(inside[0]["on"] <= start and end <= (inside[0]["off"] or end), f"{r['ref']} sticks out of its spell")
            require(cutting[0] <= ms, f"{r['ref']} was cutting longer than running")
            parts = [ms]
        for s, part in zip(inside, parts):
            shares[s["ref"], s["tag"], min(end, s["off"] or end)] += part
        per_saw[r["saw"]].append((start, end, r["ref"]))
    for saw, windows in per_saw.items():
        windows.sort()
        for a, b in zip(windows, windows[1:]):
            require(a[1] <= b[0], f"{a[2]} and {b[2]} overlap")
    return shares, two


def cuts_in(files, saw, start, end):
    return [c for t, c in files.cuts_by_saw[saw] if start <= t <= end]


def cut_ms(c):
    return round(int(c["length_mm"]) * int(c["pieces"]) * 60 / float(c["feed_m_min"]))


def check_hours(shares):
    hours = Counter()
    for (_, tag, _), ms in shares.items():
        hours[tag] += ms
    for tag, b in BLADES.items():
        require(hours[tag] == b["units"] * 360_000, f"{tag} ran {hours[tag] / 3.6e6} h, not {b['units'] / 10}")


def check_meters(files):
    epochs = {e["ref"]: e for e in files.meter_epochs}
    readings = {g["ref"]: g for g in files.meter_readings}
    last = {}
    for r in sorted((r for r in files.runs if r["source"] == "meter"), key=lambda r: at(r, "until_")):
        g = readings[r["meter_reading"]]
        before = last.get(g["epoch"], float(epochs[g["epoch"]]["first_reading_h"]))
        require(at(g) == at(r, "until_") and g["saw"] == r["saw"], f"{r['ref']} names a reading of another time")
        counted = round((float(g["reading_h"]) - before) * 3_600_000)
        require(counted == int(r["running_ms"]), f"{r['ref']} is not what the meter says")
        last[g["epoch"]] = float(g["reading_h"])
    require(last[epochs_of(files, "S2")[0]] == 1842.6, "Osprey's old meter does not end at 1,842.6")
    require(any(g["reading_h"] == "381.4" and g["saw"] == "S5" for g in files.meter_readings), "Longreach's 381.4 is missing")


def epochs_of(files, saw):
    return [e["ref"] for e in sorted(files.meter_epochs, key=at) if e["saw"] == saw]


def check_cuts(files, spells):
    for c in files.cuts:
        t = at(c)
        holder = [s for s in spells if s["saw"] == c["saw"] and s["on"] <= t and (s["off"] is None or t < s["off"])]
        require([s["tag"] for s in holder] == [c["tag"]], f"{c['ref']} is not on the blade that was mounted")
    running = sum(int(r["running_ms"]) for r in files.runs if r["saw"] == "S2")
    share = sum(cut_ms(c) for c in files.cuts if c["saw"] == "S2") / running
    require(abs(share - 0.41) < 0.01, f"Osprey's cut log accounts for {share:.3f} of its running")


def path_km(c):
    _, _, v, loop, _ = SAWS[c["saw"]]
    area = float(c["height_mm"]) * float(c["length_mm"]) * float(c["pieces"]) * 1e-6
    return area * v / (float(c["feed_m_min"]) / 60 * loop / 1000) / 1000


def check_paths(files):
    ground = {}
    for s in files.sharpenings:
        ground[s["tag"]] = max(at(s), ground.get(s["tag"], -10**9))
    for tag, b in BLADES.items():
        since = [c for c in files.cuts if c["tag"] == tag and at(c) > ground.get(tag, -10**9)]
        path = sum(path_km(c) for c in since)
        require(abs(path - b["path_km"]) <= 2e-4 * b["path_km"], f"{tag} has {path:.4f} km since sharpening, not {b['path_km']}")
        woods = {c["species"] for c in since} - {"black cherry", "Douglas-fir (coast)"}
        require(not woods and all(c["dirt"] == "clean" for c in since), f"{tag} cut more than reference wood since sharpening")


def check_sharpenings(files, spells):
    by_tag = defaultdict(list)
    for s in files.sharpenings:
        by_tag[s["tag"]].append(s)
        require(off_saw(spells, s["tag"], at(s), at(s)), f"{s['ref']}: {s['tag']} was on a saw")
    for tag, b in BLADES.items():
        own = sorted(by_tag[tag], key=at)
        require(len(own) == b["grinds"], f"{tag} has {len(own)} sharpenings, not {b['grinds']}")
        widths = [b["width_new"]] + [float(s["width_mm"]) for s in own]
        require(widths == sorted(widths, reverse=True) and widths[-1] == b["width"], f"{tag}: widths {widths}")


def check_kerf_readings(files):
    """The set beside the body gives the kerf of the specification, and so does every measure that still holds."""
    for r in files.kerf_readings:
        spec = SPECS[BLADES[r["tag"]]["spec"]]
        again = [at(s) for s in files.sharpenings if s["tag"] == r["tag"] and s["set_again"] == "yes"]
        if r["set_left_mm"]:
            both = float(r["set_left_mm"]) + float(r["set_right_mm"])
            require(abs(spec["body_mm"] + both - spec["kerf_mm"]) < 1e-9, f"{r['ref']}: body and set are not the kerf")
        if r["kerf_mm"] and max(again, default=at(r)) <= at(r):
            require(float(r["kerf_mm"]) == spec["kerf_mm"], f"{r['ref']} would move the shop's figures")


def check_loops(files):
    """Every blade that ran is as long as its saw takes, by its own joint or as its specification comes."""
    joints = {j["tag"]: int(j["loop_mm"]) for j in files.joints}
    setups = {u["saw"]: u for u in files.setups}
    for m in files.mounts:
        loop = joints.get(m["tag"], SPECS[BLADES[m["tag"]]["spec"]]["loop"])
        u = setups[m["saw"]]
        off = loop - int(u["loop_mm"])
        require(-int(u["takeup_low_mm"]) <= off <= int(u["takeup_high_mm"]), f"{m['ref']}: {loop} mm does not fit {m['saw']}")


def off_saw(spells, tag, start, end):
    return not any(s["tag"] == tag and s["on"] <= end and (s["off"] is None or s["off"] > start) for s in spells)


def check_away_and_held(files, spells):
    sent = {b["batch"]: at(b) for b in files.batches}
    back = {(r["batch"], r["tag"]): at(r) for r in files.returns}
    for line in files.batch_lines:
        until = back.get((line["batch"], line["tag"]), 0)
        require(off_saw(spells, line["tag"], sent[line["batch"]], until), f"{line['tag']} was on a saw while in {line['batch']}")
    still_out = {(x["batch"], x["tag"]) for x in files.batch_lines} - set(back)
    require(still_out == {(OPEN_BATCH, t) for t in OPEN_BATCH_TAGS}, "the open batch is not as told")
    cleared = {c["hold"]: at(c) for c in files.holds_cleared}
    for h in files.holds:
        require(off_saw(spells, h["tag"], at(h), cleared.get(h["ref"], 0)), f"{h['tag']} was on a saw while held")
    for r in files.breaks + files.retirements:
        require(off_saw(spells, r["tag"], at(r), 0), f"{r['tag']} was on a saw after its end")


def check_inspections(files, spells, shares):
    late = 0
    for tag in {s["tag"] for s in spells}:
        due = float(BLADES[tag]["inspect"]) if BLADES[tag]["inspect"].isdigit() else INSPECT_EVERY_H
        runs = [(end, 0, ms) for (_, t, end), ms in shares.items() if t == tag]
        looks = [(at(i), 1, 0) for i in files.inspections if i["tag"] == tag]
        since = 0
        for _, look, ms in sorted(runs + looks):
            late += bool(look) and since > due * 3_600_000
            since = 0 if look else since + ms
        require(since <= due * 3_600_000 or tag in BROKE, f"{tag} is overdue for inspection today")
    require(late == 38, f"{late} inspections were late, not 38")


def check_trainings(files):
    """Six people on five saws; a later training of the same person, saw and task stands for the earlier one."""
    last = {(t["person"], t["saw"], t["task"]): t for t in files.trainings}
    people = {t["person"] for t in files.trainings}
    require(len(people) == 6 and {t["saw"] for t in files.trainings if t["saw"]} == set(SAWS), "not 6 people on 5 saws")
    require(sum(t["refresher_day"] != "" and int(t["refresher_day"]) <= 0 for t in last.values()) == 2, "not 2 expired trainings")
    require(all(t["by"] != t["person"] for t in files.trainings), "somebody signed for their own training")


def check_counts(files, two):
    counts = {"sharpenings": 113, "inspections": 655, "tension_readings": 212, "breaks": 9, "retirements": 2, "holds": 2,
              "holds_cleared": 1, "joints": 4, "splits": 1, "batches": 14, "specs": 22, "blades": 41, "queue": 15,
              "saws": 5, "retags": 1, "handovers": 11, "hangs": sum(1 for b in BLADES.values() if b["hook"]), "prior_use": 1, "meter_epochs": 4}
    for name, count in counts.items():
        require(len(getattr(files, name)) == count, f"{len(getattr(files, name))} {name}, not {count}")
    require(abs(len(files.mounts) - 540) <= 10, f"{len(files.mounts)} mounts")
    require(abs(len(files.cuts) - 2900) <= 30, f"{len(files.cuts)} cut lines")
    require(sum(s["batch"] == "" for s in files.sharpenings) == 40, "not 40 sharpenings in the shop")
    require(3 <= two <= 10, f"{two} runs lie over two spells")


def check_past(files):
    names = ("mounts", "cuts", "sharpenings", "batches", "returns", "joints", "splits", "holds", "holds_cleared", "inspections", "hangs",
             "tension_readings", "breaks", "retirements", "retags", "voids", "trainings", "handovers", "meter_readings", "meter_epochs", "prior_use")
    for name in names:
        for r in files._read(name):
            for prefix in ("", "off_", "entered_"):
                t = at(r, prefix) if prefix + "day" in r else None
                require(t is None or -549 * DAY < t < 0, f"{r['ref']} does not lie in the past")
    for r in files.runs:
        require(at(r, "until_") < 0, f"{r['ref']} does not lie in the past")

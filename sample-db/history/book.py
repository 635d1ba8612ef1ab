"""Collects rows, numbers them in the order they were learned, and writes the CSV files."""

import csv

from .plan import DAY

REF_LETTERS = {
    "mounts": "m", "runs": "r", "meter_epochs": "e", "meter_readings": "g", "cuts": "c", "sharpenings": "s",
    "batches": "b", "batch_lines": "l", "returns": "u", "joints": "j", "splits": "p", "prior_use": "o",
    "holds": "h", "holds_cleared": "k", "inspections": "i", "tension_readings": "t", "breaks": "x",
    "retirements": "z", "retags": "a", "voids": "v", "hangs": "w", "trainings": "q", "handovers": "n",
    "kerf_readings": "y",
}


def day_time(minute, prefix=""):
    """Day 0 is today; the minute is counted from its first midnight."""
    if minute is None:
        return {prefix + "day": "", prefix + "time": ""}
    day, rest = divmod(minute, DAY)
    return {prefix + "day": day, prefix + "time": f"{rest // 60:02d}:{rest % 60:02d}"}


def figure(value, places=4):
    """Plain decimal figures without trailing noughts."""
    if isinstance(value, str) or value is None:
        return value or ""
    return f"{value:.{places}f}".rstrip("0").rstrip(".") if isinstance(value, float) else str(value)


class Book:
    def __init__(self):
        self.rows = {name: [] for name in REF_LETTERS}

    def add(self, name, learned, **columns):
        """learned: the minute at which the shop entered it, which numbers the row."""
        row = {"ref": None, **columns}
        self.rows[name].append((learned, len(self.rows[name]), row))
        return row

    def write(self, folder):
        for name, entries in self.rows.items():
            entries.sort(key=lambda e: e[:2])
            digits = 4 if len(entries) > 99 else 2
            for number, (_, _, row) in enumerate(entries, 1):
                row["ref"] = f"{REF_LETTERS[name]}-{number:0{digits}d}"
        for name, entries in self.rows.items():
            plain = [{k: v["ref"] if isinstance(v, dict) else figure(v) for k, v in row.items()} for _, _, row in entries]
            write_csv(folder, name, list(plain[0]), plain)


def write_csv(folder, name, headings, rows):
    with open(folder / f"{name}.csv", "w", newline="", encoding="utf-8") as file:
        writer = csv.DictWriter(file, headings, lineterminator="\n")
        writer.writeheader()
        writer.writerows(rows)


def write_lines(folder, name, headings, lines):
    with open(folder / f"{name}.csv", "w", newline="", encoding="utf-8") as file:
        file.write(",".join(headings) + "\n")
        file.writelines(line + "\n" for line in lines)

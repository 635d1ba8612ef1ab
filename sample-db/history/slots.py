"""When each blade goes to be sharpened and how much it runs in between. Counted in days and tenths of an hour."""

from dataclasses import dataclass

from .tables import BLADES, PERIODS


@dataclass
class Sharpening:
    tag: str
    number: int
    batch: int | None      # index into the batches, none = made in the shop
    start: int             # days the blade is kept free of the saw
    end: int
    at: int = 0


def batch_windows():
    """Thirteen batches taken to the service on a free day and back nine days later."""
    windows = []
    for i in range(13):
        day = round(-520 + i * (520 - 34) / 12)
        sent = day - (day - 1) % 7
        windows.append((sent, sent + 9))
    return windows


def sharpening_slots(tag, batches):
    first, last, sent_out = PERIODS[tag]
    grinds = BLADES[tag]["grinds"]
    chosen = _chosen_batches(tag, first, last, sent_out, batches)
    slots = [Sharpening(tag, 0, j, *batches[j]) for j in chosen]
    at_home = grinds - sent_out
    if tag in ("Q-10", "Q-33", "Q-34", "Q-35"):     # touched up the Thursday before the open batch left
        slots.append(Sharpening(tag, 0, None, -10, -6))
        at_home -= 1
    for _ in range(at_home):
        slots.append(_in_widest_gap(tag, first, last, slots))
    slots.sort(key=lambda s: s.start)
    for number, slot in enumerate(slots, 1):
        slot.number = number
    return slots


def _chosen_batches(tag, first, last, count, batches):
    if tag == "Q-07":                                # came back in the last batch and was sent again unused
        return _spread([j for j in range(12) if batches[j][0] > first + 12], count - 1) + [12]
    fit = [j for j, (sent, back) in enumerate(batches) if sent > first + 8 and back < last - 6]
    return _spread(fit, count)


def _spread(items, count):
    assert count <= len(items), (count, items)
    return [items[int((i + 0.5) * len(items) / count)] for i in range(count)]


def _in_widest_gap(tag, first, last, slots):
    edges = sorted([(first, first)] + [(s.start, s.end) for s in slots if s.start < last] + [(last, last)])
    gaps = [(b[0] - a[1], a[1], b[0]) for a, b in zip(edges, edges[1:])]
    _, start, end = max(gaps)
    middle = (start + end) // 2
    return Sharpening(tag, 0, None, middle - 3, middle + 4)


def intervals(tag, slots):
    first, last, _ = PERIODS[tag]
    edges = [first] + [d for s in slots for d in (s.start, s.end)] + [last]
    return list(zip(edges[0::2], edges[1::2]))


def interval_units(tag, spans, rng):
    """Tenths of an hour between the sharpenings: longer where the calendar leaves more room."""
    blade = BLADES[tag]
    total = blade["units"]
    if len(spans) == 1:
        return [total]
    final = _final_units(tag, total / len(spans))
    mean = sum(e - s for s, e in spans[:-1]) / (len(spans) - 1)
    weights = [(0.6 + 0.4 * max(0, e - s) / mean) * rng.uniform(0.9, 1.1) for s, e in spans[:-1]]
    return whole_shares(total - final, weights) + [final]


def _final_units(tag, mean):
    blade = BLADES[tag]
    if tag == "Q-32":
        return 19
    if tag == "Q-04":
        return 4
    if blade["path_km"] == 0:
        return 0
    usual = {"S5": 10.0, "S3": 6.0}.get(blade["saw"], 9.0)
    return max(8, round(mean * min(1.0, max(0.25, blade["path_km"] / usual))))


def whole_shares(total, weights):
    """Whole numbers in proportion to the weights that add up to the total."""
    raw = [total * w / sum(weights) for w in weights]
    whole = [int(r) for r in raw]
    by_rest = sorted(range(len(raw)), key=lambda i: whole[i] - raw[i])
    for i in by_rest[: total - sum(whole)]:
        whole[i] += 1
    return whole

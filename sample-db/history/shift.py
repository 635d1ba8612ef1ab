"""Who was trained at what, and what one shift told the next."""

from .book import day_time
from .plan import DAY, works

YEAR = 365

# person, saw (empty: all), tasks, day, by, years until a refresher; five years for those who saw daily, three for the
# others, as one training body suggests. What matters to the story: two of these have run out.
_OPERATE = "operate|change_blade"
_TRAININGS = [
    ("MI", "S1", _OPERATE, -540, "OT", 5), ("MI", "S2", _OPERATE, -540, "OT", 5), ("MI", "S3", _OPERATE, -540, "OT", 5),
    ("MI", "S4", _OPERATE, -540, "OT", 5), ("MI", "S5", "operate", -539, "OT", 3),
    ("OT", "S1", _OPERATE, -547, "MI", 5), ("OT", "S2", _OPERATE, -547, "MI", 5), ("OT", "S3", _OPERATE, -547, "MI", 5),
    ("OT", "S4", _OPERATE, -547, "MI", 5), ("OT", "S5", _OPERATE, -547, "MI", 5),
    ("JP", "S1", _OPERATE, -533, "OT", 5), ("JP", "S2", _OPERATE, -533, "OT", 5), ("JP", "S3", _OPERATE, -533, "OT", 5),
    ("JP", "S4", "operate", -533, "OT", 5),
    ("RU", "S1", _OPERATE, -526, "OT", 5), ("RU", "S2", "operate", -526, "OT", 5), ("RU", "S5", _OPERATE, -526, "OT", 5),
    ("IC", "S2", "operate", -519, "OT", 3), ("IC", "S3", _OPERATE, -519, "OT", 3), ("IC", "S4", _OPERATE, -519, "OT", 3),
    ("PR", "S3", "operate", -512, "JP", 1), ("PR", "S4", "operate", -512, "JP", 1),
    ("PR", "S2", "operate", -470, "JP", 1), ("PR", "S3", "operate", -140, "JP", 1),
    ("MI", "", "clear_hold|sharpen", -540, "OT", None), ("OT", "", "sharpen|weld|clear_hold", -547, "MI", None),
    ("JP", "", "sharpen", -532, "OT", 5), ("RU", "", "sharpen", -525, "OT", 5),
]

# day, time, who, lines, who read it
_HANDOVERS = [
    (-403, "16:05", "OT", ["Hold: Q-05, gullet crack 0.8 mm. On the red hook, I grind it out.", "Old Heron has Q-01 on."], "JP|MI"),
    (-382, "15:55", "JP", ["Q-23 broke on Wren at a gullet. Pieces are in the tray on the bench.", "Wren is empty, door shut."], "OT"),
    (-359, "16:00", "MI", ["New hour meter on Osprey, reading starts from nought.", "Write the old reading nowhere any more."], "JP|RU"),
    (-263, "16:10", "OT", ["Q-04 broke at its weld on Old Heron. Body is good: I cut it down for Osprey.", "Do not put the pieces in the bin."], "MI|JP"),
    (-218, "15:40", "RU", ["Q-36 broke on Longreach. PR writes the hours in.", "Tyres looked at, no damage."], "OT"),
    (-136, "12:00", "JP", ["Label 24 is on two blades. The 10 mm one has no number for now: tell them apart by width."], "OT"),
    (-95, "16:05", "RU", ["Longreach needs a sharp blade tomorrow, Q-35 is in the box.", "Hose was frozen, let it thaw first."], "JP"),
    (-39, "15:50", "IC", ["Q-13 is set aside for the tonewood billets. Please leave it on hook R2-5."], "MI"),
    (-11, "16:00", "MI", ["Q-09 is past its mark: rough work only, no further grind."], "JP|RU|IC"),
    (-4, "15:30", "MI", ["B-031 is away with five blades.", "Longreach is short: Q-32 is nearly dull, Q-40 is untried."], "RU|OT"),
    (-3, "16:10", "OT", ["Hold: Q-14, gullet crack 2.6 mm, found after clicking on Osprey. On hook H-1.", "Osprey has Q-08 on.", "Tension is off on Finch."], "JP"),
]


def trainings(book):
    for person, saw, tasks, day, by, years in _TRAININGS:
        for n, task in enumerate(tasks.split("|")):
            at = day * DAY + 9 * 60 + n
            book.add("trainings", at, person=person, saw=saw, task=task, **day_time(at), by=by,
                     refresher_day="" if years is None else day + years * YEAR, who=by)


def handovers(book):
    for day, time, who, lines, read in _HANDOVERS:
        assert works(day), f"nobody works on day {day}"
        hour, minute = map(int, time.split(":"))
        at = day * DAY + hour * 60 + minute
        book.add("handovers", at, **day_time(at), text="|".join(lines), read_by=read, who=who)

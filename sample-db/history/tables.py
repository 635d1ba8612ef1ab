"""The invented shop: saws, specifications, blades, queue. Everything here is made up."""

FIRST_DAY = -548
UNIT_MS = 360_000          # a tenth of an hour, the last figure of an hour meter
INSPECT_EVERY_H = 8        # the shop's own rule, unless the blade has another

SHOP = [
    ("name", "Quillmere Joinery & Boat Shed"), ("zone", "UTC"), ("lengths", "millimetre"), ("spelling", "uk"), ("pull_word", "tension"),
    ("currency_digits", "2"), ("shop_rate_minor_per_h", "4800"), ("timber_value_minor_per_m3", "80000"),
]

# initials, name, may clear holds, may sharpen, may weld
PEOPLE = [
    ("MI", "M. I., manager", "yes", "yes", "no"),
    ("OT", "O. T., saw doctor", "yes", "yes", "yes"),
    ("JP", "J. P., machinist", "no", "yes", "no"),
    ("RU", "R. U., sawyer", "no", "yes", "no"),
    ("IC", "I. C., luthier", "no", "no", "no"),
    ("PR", "P. R., apprentice", "no", "no", "no"),
    ("CLASS", "Evening class", "no", "no", "no"),
]

SETUP_HEADINGS = (
    "saw,wheel_diameters_mm,driven_wheel,speeds_m_s,loop_mm,takeup_low_mm,takeup_high_mm,"
    "least_blade_width_mm,greatest_blade_width_mm,lower_guide_mm,upper_clearance_mm,greatest_cut_height_mm,"
    "longest_piece_mm,takes,class_work,greatest_strand_force_n,tension_system,motor_kw,idle_share,feeder_n,"
    "feeder_max_m_min,change_min,break_cost_minor,tilt_deg,meter_factor"
).split(",")
SETUPS = [
    "S1,900|900,2,20.7,5690,30,30,10,50,60,10,500,12000,beam|board,no,6600,sprung,5.5,,400,8,12,7500,40,1",
    "S2,700|700,2,23.5,5080,25,25,6,50,50,10,450,3600,board|resaw,no,5200,sprung,5.5,,250,8,8,7500,0,1",
    "S3,356|356,2,15.2|7.6,2667,12,12,3,19,40,8,300,2000,board|resaw,supervised,800,sprung,1.1,,,,6,4000,0,1",
    "S4,205|205|205,3,12.0,1425,8,8,3,10,35,6,100,1000,board,yes,280,sprung,0.4,,,,5,3000,0,1",
    "S5,489|489,2,25.0,4013,20,20,24,38,40,40,620,6000,beam|log,no,4200,sprung,18.0,,500,20,4,5500,0,1",
]
# code: name, hour meter, usual speed m/s, loop mm, reference feed m/min
SAWS = {
    "S1": ("Old Heron", True, 20.7, 5690, 2), "S2": ("Osprey", True, 23.5, 5080, 2),
    "S3": ("Wren", False, 15.2, 2667, 2), "S4": ("Finch", False, 12.0, 1425, 2),
    "S5": ("Longreach", True, 25.0, 4013, 8),
}
RUN_SOURCE = {"S1": ("A", "meter"), "S2": ("A", "meter"), "S3": ("B", "timer"), "S4": ("D", "typed"),
              "S5": ("A", "meter")}
ON_SAW_NOW = {"S1": "Q-01", "S2": "Q-08", "S3": "Q-17", "S4": "Q-30", "S5": "Q-32"}

# spec, width, body, coarsest and finest pitch as points per inch, form, hook deg, gullet mm, kerf mm, tips,
# tooth material, body steel, body HRC, price, sharpening price (minor units), most sharpenings, tension MPa, loop mm
_SPECS = """
A1 38 0.9  2   2   hook 10 5.0 1.45 set    hardened_carbon flexible_back   30  4600 1000 12 135 5690
A2 25 0.8  3   3   hook 10 3.4 1.36 set    hardened_carbon flexible_back   30  3600  900 12 135 5690
A3 13 0.65 4   4   skip  0 1.6 1.15 set    hardened_carbon flexible_back   30  2600  800 12 110 5690
A4 50 1.0  -19 -19 hook 20 7.0 2.00 swaged plain_steel     wide_strip      44  9000 1600 -  150 5690
B1 38 0.9  1.3 1.3 hook 10 6.5 1.60 tipped carbide         carbide_tipped  46 21000 4500 5  150 5080
B2 38 0.9  2   3   hook 10 4.2 1.50 tipped carbide         carbide_tipped  46 19500 4500 5  150 5080
B3 25 0.9  3   3   hook 10 3.4 1.50 set    hardened_carbon flexible_back   30  4100  900 12 135 5080
B4 19 0.8  3   3   hook 10 3.4 1.36 set    hardened_carbon flexible_back   30  3300  900 12 130 5080
B5 13 0.635 4  4   skip  0 1.6 1.12 set    hardened_carbon flexible_back   30  2400  800 12 110 5080
B6 6 0.635 6   6   regular 0 1.5 1.10 set  hardened_carbon flexible_back   30  1600    0 0   90 5080
B7 25 0.65 3   4   hook 10 2.7 0.95 set    bimetal         bimetal         46  7600 1400 6  150 5080
C1 13 0.635 3  3   hook 10 3.0 1.10 set    hardened_carbon flexible_back   32  1900  700 12  90 2667
C2 13 0.5  3   4   hook 10 2.7 0.85 set    hardened_carbon flexible_back   32  2000  700 12  90 2667
C3 10 0.635 4  4   skip  0 1.6 1.10 set    hardened_carbon flexible_back   32  1700  700 12  90 2667
C4 6 0.635 6   6   regular 0 1.5 1.10 set  hardened_carbon flexible_back   32  1400    0 0   80 2667
C5 3 0.635 14  14  regular 0 0.7 1.05 set  hardened_carbon flexible_back   32  1400    0 0   70 2667
C6 19 0.8  3   3   hook 10 3.4 1.36 set    hardened_carbon flexible_back   32  2300  700 12  60 2667
D1 10 0.635 4  4   skip  0 1.6 1.10 set    hardened_carbon spring_tempered 48  1800    0 0   50 1425
D2 6 0.36  6   6   regular 0 1.5 0.68 set  hardened_carbon spring_tempered 48  1500    0 0   60 1425
E1 32 1.07 -22 -22 hook 10 6.0 1.95 set    hardened_carbon spring_tempered 46  3200  850 10 120 4013
E2 32 1.07 -22 -22 hook 7  6.0 1.95 set    hardened_carbon spring_tempered 46  3200  850 10 120 4013
E3 32 0.9  -22 -22 hook 10 6.0 1.70 set    hardened_carbon spring_tempered 46  3000  850 10 120 4013
"""

# tag, spec, saw, hours, sharpenings in its own name, new width, width now, path km, hook, folded, inspect
_BLADES = """
Q-01  A1 S1 212   9 38 35.4 1.2  -    no  -
Q-02  A2 S1 148   6 25 23.6 0.4  R1-1 no  -
Q-03  A3 S1 61    2 13 12.6 0.8  R1-2 no  -
Q-04  A1 S1 63    4 38 37.0 0    -    no  -
Q-05  A4 S1 305  14 50 43.0 0.3  R1-3 no  -
Q-06  A2 S1 26    1 22.1 21.8 2.0 R1-4 no mount
Q-04b A1 S2 34    2 37.0 36.6 1.0 R2-1 no 4
Q-07  B1 S2 118   3 38 37.4 0    -    no  -
Q-08  B2 S2 64    1 38 37.8 0.5  -    no  -
Q-09  B3 S2 310   9 25 20.6 2.4  R2-2 no  -
Q-10  B4 S2 88    4 19 18.2 0    -    no  -
Q-11  B5 S2 45    1 13 12.8 0.1  R2-3 no  -
Q-12  B6 S2 19    0 6  6    1.0  R2-4 no  -
Q-13  B7 S2 72    3 25 24.4 0.6  R2-5 no  -
Q-14  A1 S2 133   5 38 37.0 2.0  H-1  no  -
Q-15  B3 S2 0     0 25 25   0    R2-6 yes -
Q-16  B5 S2 0     0 13 13   0    R2-7 yes -
Q-17  C1 S3 9     1 13 12.8 0.6  -    no  -
Q-18  C2 S3 38    2 13 12.6 1.5  R3-1 no  -
Q-19  C3 S3 8     0 10 10   1.6  R3-2 no  -
Q-20  C4 S3 13.5  0 6  6    0.8  R3-3 no  -
Q-21  C5 S3 6     0 3  3    0.15 R3-4 no  -
Q-22  C6 S3 4.2   0 19 19   1.0  -    no  -
Q-23  C1 S3 29    3 13 12.4 1.0  -    no  -
Q-24  C1 S3 0     0 13 13   0    R3-5 yes -
Q-25  C3 S3 4     0 10 10   0.9  R3-6 no  -
Q-26  D1 S4 0.3   0 10 10   0.1  -    no  -
Q-27  D1 S4 0.5   0 10 10   0.1  -    no  -
Q-28  D1 S4 0.7   0 10 10   0.1  -    no  -
Q-29  D1 S4 1.1   0 10 10   0.2  -    no  -
Q-30  D2 S4 11.5  0 6  6    0.9  -    no  -
Q-31  D2 S4 0     0 6  6    0    R4-1 yes -
Q-32  E1 S5 9.4   5 32 27.6 10.9 -    no  -
Q-33  E1 S5 11.9  7 32 26.4 0    -    no  -
Q-34  E1 S5 6.4   3 32 29.5 0    -    no  -
Q-35  E1 S5 8     4 32 28.6 0    -    no  -
Q-36  E1 S5 15.8  7 32 26.2 5    -    no  -
Q-37  E1 S5 18.9  8 32 25.2 5    -    no  -
Q-38  E2 S5 14    8 32 23.8 5    -    no  -
Q-39  E1 S5 3.1   1 32 31.2 2    -    no  -
Q-40  E3 S5 0     0 32 32   0    R5-1 yes -
"""

# tag: first day, last day, how many of its sharpenings the service made.
# A blade stays in its period; what the stories fix (months, breaks, the open batch) is fixed here.
PERIODS = {
    "Q-01": (-548, -2, 5), "Q-02": (-544, -12, 4), "Q-03": (-500, -30, 1), "Q-04": (-548, -262, 3),
    "Q-05": (-548, -12, 8), "Q-06": (-530, -60, 1), "Q-04b": (-248, -14, 1), "Q-07": (-540, -38, 3),
    "Q-08": (-200, -1, 1), "Q-09": (-548, -13, 5), "Q-10": (-400, -11, 3), "Q-11": (-300, -16, 1),
    "Q-12": (-450, -40, 0), "Q-13": (-360, -10, 3), "Q-14": (-420, -3, 3), "Q-17": (-90, -2, 1),
    "Q-18": (-390, -20, 2), "Q-19": (-330, -50, 0), "Q-20": (-440, -35, 0), "Q-21": (-400, -60, 0),
    "Q-22": (-510, -470, 0), "Q-23": (-548, -375, 2), "Q-25": (-150, -138, 0), "Q-26": (-481, -480, 0),
    "Q-27": (-461, -459, 0), "Q-28": (-440, -433, 0), "Q-29": (-418, -402, 0), "Q-30": (-394, -2, 0),
    "Q-32": (-220, -2, 3), "Q-33": (-380, -11, 4), "Q-34": (-190, -11, 2), "Q-35": (-280, -12, 2),
    "Q-36": (-520, -205, 4), "Q-37": (-548, -190, 5), "Q-38": (-545, -170, 5), "Q-39": (-340, -260, 1),
}
BROKE = ("Q-04", "Q-22", "Q-23", "Q-26", "Q-27", "Q-28", "Q-29", "Q-36", "Q-37")
OPEN_BATCH = "B-031"
OPEN_BATCH_TAGS = ("Q-07", "Q-10", "Q-33", "Q-34", "Q-35")

# tag, after which of its sharpenings (0: the last), how, kerf mm, set left and right mm, note, who
# What still holds agrees with the specification, so that no figure of the shop rests on these rows alone.
KERF_READINGS = [
    ("Q-37", 2, "test_cut", 2.05, 0.42, 0.46, "the slot is wider than the teeth: guides were loose", "OT"),
    ("Q-02", 0, "over_teeth", 1.36, 0.28, 0.28, "", "OT"),
    ("Q-08", 0, "over_teeth", 1.5, "", "", "", "MI"),
    ("Q-09", 0, "test_cut", 1.5, "", "", "for the resaw list", "JP"),
    ("Q-18", 0, "dial_gauge", "", 0.21, 0.14, "leads when cutting free", "OT"),
]

# what the shop calls it, key and wear class of the handbook's table
SPECIES = [
    ("European oak", "european_oak", "wood", "A3"), ("European larch", "european_larch", "wood", "A2"),
    ("Scots pine", "scots_pine", "wood", "A1"), ("sugar maple", "sugar_maple", "wood", "A3"),
    ("Douglas-fir (coast)", "douglas_fir_coast", "wood", "A2"), ("Norway spruce", "norway_spruce", "wood", "A1"),
    ("European ash", "european_ash", "wood", "A3"), ("black walnut", "black_walnut", "wood", "A2"),
    ("black cherry", "black_cherry", "wood", "A2"), ("yellow-poplar", "yellow_poplar", "wood", "A1"),
    ("Indian rosewood", "indian_rosewood", "wood", "A4"), ("birch plywood", "birch_plywood", "panel", "P"),
    ("aluminium", "aluminium", "other", ""),
]

QUEUE_HEADINGS = (
    "number,job,material_kind,species,height_mm,length_mm,pieces,tightest_radius_mm,bevel_deg,moisture_pct,"
    "frozen,dirt,direction,kind,finish,nail_chance,timber_value_minor_per_m3,class_work,order,added_day,due_day"
).split(",")
QUEUE = [
    "1,chair back legs,wood,European oak,45,800,12,90,0,10,no,clean,rip,board,medium,0,,no,1,-2,2",
    "2,drawer-front resaw,wood,black cherry,200,1200,6,,0,9,no,clean,rip,resaw,medium,0,250000,no,2,-2,2",
    "3,guitar backs,wood,Indian rosewood,190,560,10,,0,8,no,clean,rip,resaw,medium,0,9000000,no,3,-2,5",
    "4,soundboards,wood,Norway spruce,220,600,8,,0,8,no,clean,rip,resaw,medium,0,1500000,no,4,-2,5",
    "5,\"dinghy frames, rolling bevel to 22 deg\",wood,European oak,50,1400,14,400,22,18,no,clean,rip,board,rough,0,,no,5,-2,7",
    "6,larch planking,wood,European larch,28,4500,18,3000,0,16,no,clean,rip,board,medium,0,,no,6,-2,7",
    "7,beam resaw,wood,Douglas-fir (coast),300,3000,4,,0,18,no,clean,rip,beam,medium,0,,no,7,-2,3",
    "8,plywood brackets,panel,birch plywood,12,300,60,20,0,9,no,clean,rip,board,fine,0,,no,8,-2,9",
    "9,puzzle boxes,wood,sugar maple,6,400,40,5,0,8,no,clean,rip,board,fine,0,,no,9,-2,12",
    "10,\"bowl blanks, green\",wood,black walnut,100,900,8,140,0,60,no,clean,rip,board,rough,0,,no,10,-2,1",
    "11,slabs,wood,European ash,320,2600,9,,0,45,no,bark_on,rip,log,rough,0,,no,11,-2,4",
    "12,\"reclaimed beam, nail risk\",wood,Scots pine,180,3200,5,,0,14,no,reclaimed,rip,beam,rough,0.3,,no,12,-2,6",
    "13,aluminium angle,other,aluminium,3,500,6,,0,0,no,clean,rip,board,rough,0,,no,13,-2,6",
    "14,face veneers 4 mm,wood,sugar maple,160,900,9,,0,8,no,clean,rip,resaw,medium,0,300000,no,14,-2,8",
    "15,scroll corbels (class),wood,yellow-poplar,19,400,20,12,0,9,no,clean,rip,board,medium,0,,yes,15,-2,3",
]


def _pitch_mm(points):
    """Points per inch; a negative figure is a pitch in mm as the mill trade prints it."""
    value = float(points)
    return -value if value < 0 else 25.4 / value


def _read_specs():
    rows = {}
    for line in _SPECS.split("\n"):
        if not line.strip():
            continue
        c = line.split()
        rows[c[0]] = dict(
            spec=c[0], width_mm=float(c[1]), body_mm=float(c[2]), pitch_coarse_mm=_pitch_mm(c[3]),
            pitch_fine_mm=_pitch_mm(c[4]), form=c[5], hook_deg=float(c[6]), gullet_mm=float(c[7]),
            kerf_mm=float(c[8]), tips=c[9], tooth=c[10], steel=c[11], hrc=int(c[12]), price=int(c[13]),
            sharpening=int(c[14]), most="" if c[15] == "-" else c[15], tension=int(c[16]), loop=int(c[17]),
            edge_um=10 if c[10] == "carbide" else 8)
    return rows


def _read_blades():
    rows = {}
    for line in _BLADES.split("\n"):
        if not line.strip():
            continue
        c = line.split()
        rows[c[0]] = dict(
            tag=c[0], spec=c[1], saw=c[2], units=round(float(c[3]) * 10), grinds=int(c[4]), width_new=float(c[5]),
            width=float(c[6]), path_km=float(c[7]), hook="" if c[8] == "-" else c[8], folded=c[9],
            inspect="" if c[10] == "-" else c[10])
    return rows


SPECS = _read_specs()
BLADES = _read_blades()

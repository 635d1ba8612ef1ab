using System;
using Microsoft.EntityFrameworkCore.Migrations;

#nullable disable

namespace BladeLog.Records.Migrations
{
    /// <inheritdoc />
    public partial class First : Migration
    {
        /// <inheritdoc />
        protected override void Up(MigrationBuilder migrationBuilder)
        {
            migrationBuilder.CreateTable(
                name: "person",
                columns: table => new
                {
                    id = table.Column<int>(type: "INTEGER", nullable: false)
                        .Annotation("Sqlite:Autoincrement", true),
                    initials = table.Column<string>(type: "TEXT", nullable: false, collation: "NOCASE"),
                    name = table.Column<string>(type: "TEXT", nullable: false),
                    active = table.Column<bool>(type: "INTEGER", nullable: false),
                    uid = table.Column<Guid>(type: "TEXT", nullable: false),
                    version = table.Column<int>(type: "INTEGER", nullable: false)
                },
                constraints: table =>
                {
                    table.PrimaryKey("PK_person", x => x.id);
                    table.CheckConstraint("ck_person_version", "\"version\" > 0");
                });

            migrationBuilder.CreateTable(
                name: "saw",
                columns: table => new
                {
                    id = table.Column<int>(type: "INTEGER", nullable: false)
                        .Annotation("Sqlite:Autoincrement", true),
                    code = table.Column<string>(type: "TEXT", nullable: false, collation: "NOCASE"),
                    name = table.Column<string>(type: "TEXT", nullable: false),
                    active = table.Column<bool>(type: "INTEGER", nullable: false),
                    has_hour_meter = table.Column<bool>(type: "INTEGER", nullable: false),
                    uid = table.Column<Guid>(type: "TEXT", nullable: false),
                    version = table.Column<int>(type: "INTEGER", nullable: false)
                },
                constraints: table =>
                {
                    table.PrimaryKey("PK_saw", x => x.id);
                    table.CheckConstraint("ck_saw_version", "\"version\" > 0");
                });

            migrationBuilder.CreateTable(
                name: "setting",
                columns: table => new
                {
                    key = table.Column<string>(type: "TEXT", nullable: false),
                    value = table.Column<double>(type: "REAL", nullable: false),
                    typed = table.Column<string>(type: "TEXT", nullable: false)
                },
                constraints: table =>
                {
                    table.PrimaryKey("PK_setting", x => x.key);
                    table.CheckConstraint("ck_setting_value", "\"value\" > -1e300 and \"value\" < 1e300");
                });

            migrationBuilder.CreateTable(
                name: "shop",
                columns: table => new
                {
                    id = table.Column<int>(type: "INTEGER", nullable: false)
                        .Annotation("Sqlite:Autoincrement", true),
                    name = table.Column<string>(type: "TEXT", nullable: false),
                    zone = table.Column<string>(type: "TEXT", nullable: false),
                    lengths = table.Column<string>(type: "TEXT", nullable: false),
                    spelling = table.Column<string>(type: "TEXT", nullable: false),
                    pull_word = table.Column<string>(type: "TEXT", nullable: false),
                    rate_minor_per_hour = table.Column<long>(type: "INTEGER", nullable: false),
                    currency_digits = table.Column<int>(type: "INTEGER", nullable: false),
                    timber_minor_per_m3 = table.Column<long>(type: "INTEGER", nullable: false),
                    is_sample = table.Column<bool>(type: "INTEGER", nullable: false),
                    uid = table.Column<Guid>(type: "TEXT", nullable: false),
                    version = table.Column<int>(type: "INTEGER", nullable: false)
                },
                constraints: table =>
                {
                    table.PrimaryKey("PK_shop", x => x.id);
                    table.CheckConstraint("ck_shop_currency_digits", "\"currency_digits\" >= 0");
                    table.CheckConstraint("ck_shop_rate_minor_per_hour", "\"rate_minor_per_hour\" >= 0");
                    table.CheckConstraint("ck_shop_timber_minor_per_m3", "\"timber_minor_per_m3\" >= 0");
                    table.CheckConstraint("ck_shop_version", "\"version\" > 0");
                });

            migrationBuilder.CreateTable(
                name: "spec",
                columns: table => new
                {
                    id = table.Column<int>(type: "INTEGER", nullable: false)
                        .Annotation("Sqlite:Autoincrement", true),
                    code = table.Column<string>(type: "TEXT", nullable: false, collation: "NOCASE"),
                    width_m = table.Column<double>(type: "REAL", nullable: false),
                    width_typed = table.Column<string>(type: "TEXT", nullable: true),
                    thickness_m = table.Column<double>(type: "REAL", nullable: false),
                    thickness_typed = table.Column<string>(type: "TEXT", nullable: true),
                    pitch_coarse_m = table.Column<double>(type: "REAL", nullable: false),
                    pitch_fine_m = table.Column<double>(type: "REAL", nullable: false),
                    pitch_typed = table.Column<string>(type: "TEXT", nullable: true),
                    tooth_form = table.Column<string>(type: "TEXT", nullable: false),
                    rake_rad = table.Column<double>(type: "REAL", nullable: true),
                    gullet_depth_m = table.Column<double>(type: "REAL", nullable: true),
                    gullet_radius_m = table.Column<double>(type: "REAL", nullable: true),
                    kerf_m = table.Column<double>(type: "REAL", nullable: true),
                    kerf_typed = table.Column<string>(type: "TEXT", nullable: true),
                    set_pattern = table.Column<string>(type: "TEXT", nullable: false),
                    tip_kind = table.Column<string>(type: "TEXT", nullable: false),
                    tip_material = table.Column<string>(type: "TEXT", nullable: false),
                    body_steel = table.Column<string>(type: "TEXT", nullable: false),
                    body_hrc = table.Column<double>(type: "REAL", nullable: true),
                    new_loop_m = table.Column<double>(type: "REAL", nullable: true),
                    new_loop_typed = table.Column<string>(type: "TEXT", nullable: true),
                    tension_pa = table.Column<double>(type: "REAL", nullable: true),
                    tension_typed = table.Column<string>(type: "TEXT", nullable: true),
                    least_width_m = table.Column<double>(type: "REAL", nullable: true),
                    sharpening_price_minor = table.Column<long>(type: "INTEGER", nullable: true),
                    most_sharpenings = table.Column<int>(type: "INTEGER", nullable: true),
                    edge_fresh_m = table.Column<double>(type: "REAL", nullable: true),
                    price_minor = table.Column<long>(type: "INTEGER", nullable: true),
                    uid = table.Column<Guid>(type: "TEXT", nullable: false),
                    version = table.Column<int>(type: "INTEGER", nullable: false)
                },
                constraints: table =>
                {
                    table.PrimaryKey("PK_spec", x => x.id);
                    table.CheckConstraint("ck_spec_body_hrc", "\"body_hrc\" > 0 and \"body_hrc\" < 1e300");
                    table.CheckConstraint("ck_spec_body_in_width", "thickness_m < width_m");
                    table.CheckConstraint("ck_spec_edge_fresh_m", "\"edge_fresh_m\" > 0 and \"edge_fresh_m\" < 1e300");
                    table.CheckConstraint("ck_spec_gullet_depth_m", "\"gullet_depth_m\" > 0 and \"gullet_depth_m\" < 1e300");
                    table.CheckConstraint("ck_spec_gullet_in_width", "gullet_depth_m is null or gullet_depth_m < width_m");
                    table.CheckConstraint("ck_spec_gullet_radius_m", "\"gullet_radius_m\" > 0 and \"gullet_radius_m\" < 1e300");
                    table.CheckConstraint("ck_spec_kerf_m", "\"kerf_m\" > 0 and \"kerf_m\" < 1e300");
                    table.CheckConstraint("ck_spec_kerf_over_body", "kerf_m is null or kerf_m > thickness_m");
                    table.CheckConstraint("ck_spec_least_width", "least_width_m is null or least_width_m <= width_m");
                    table.CheckConstraint("ck_spec_least_width_m", "\"least_width_m\" > 0 and \"least_width_m\" < 1e300");
                    table.CheckConstraint("ck_spec_most_sharpenings", "\"most_sharpenings\" >= 0");
                    table.CheckConstraint("ck_spec_new_loop_m", "\"new_loop_m\" > 0 and \"new_loop_m\" < 1e300");
                    table.CheckConstraint("ck_spec_pitch_coarse_m", "\"pitch_coarse_m\" > 0 and \"pitch_coarse_m\" < 1e300");
                    table.CheckConstraint("ck_spec_pitch_fine_m", "\"pitch_fine_m\" > 0 and \"pitch_fine_m\" < 1e300");
                    table.CheckConstraint("ck_spec_pitch_order", "pitch_fine_m <= pitch_coarse_m");
                    table.CheckConstraint("ck_spec_price_minor", "\"price_minor\" >= 0");
                    table.CheckConstraint("ck_spec_rake_rad", "\"rake_rad\" > -1e300 and \"rake_rad\" < 1e300");
                    table.CheckConstraint("ck_spec_sharpening_price_minor", "\"sharpening_price_minor\" >= 0");
                    table.CheckConstraint("ck_spec_tension_pa", "\"tension_pa\" > 0 and \"tension_pa\" < 1e300");
                    table.CheckConstraint("ck_spec_thickness_m", "\"thickness_m\" > 0 and \"thickness_m\" < 1e300");
                    table.CheckConstraint("ck_spec_version", "\"version\" > 0");
                    table.CheckConstraint("ck_spec_width_m", "\"width_m\" > 0 and \"width_m\" < 1e300");
                });

            migrationBuilder.CreateTable(
                name: "entry",
                columns: table => new
                {
                    id = table.Column<int>(type: "INTEGER", nullable: false)
                        .Annotation("Sqlite:Autoincrement", true),
                    op = table.Column<Guid>(type: "TEXT", nullable: false),
                    part = table.Column<int>(type: "INTEGER", nullable: false),
                    kind = table.Column<string>(type: "TEXT", nullable: false),
                    at_utc = table.Column<DateTime>(type: "TEXT", nullable: false),
                    entered_utc = table.Column<DateTime>(type: "TEXT", nullable: false),
                    typed_at = table.Column<string>(type: "TEXT", nullable: true),
                    person_id = table.Column<int>(type: "INTEGER", nullable: true),
                    device = table.Column<string>(type: "TEXT", nullable: true),
                    body_sha256 = table.Column<byte[]>(type: "BLOB", nullable: true),
                    answer_path = table.Column<string>(type: "TEXT", nullable: true),
                    previous_hash = table.Column<byte[]>(type: "BLOB", nullable: true),
                    hash = table.Column<byte[]>(type: "BLOB", nullable: true)
                },
                constraints: table =>
                {
                    table.PrimaryKey("PK_entry", x => x.id);
                    table.CheckConstraint("ck_entry_part", "\"part\" >= 0");
                    table.ForeignKey(
                        name: "FK_entry_person_person_id",
                        column: x => x.person_id,
                        principalTable: "person",
                        principalColumn: "id",
                        onDelete: ReferentialAction.Restrict);
                });

            migrationBuilder.CreateTable(
                name: "person_role",
                columns: table => new
                {
                    id = table.Column<int>(type: "INTEGER", nullable: false)
                        .Annotation("Sqlite:Autoincrement", true),
                    person_id = table.Column<int>(type: "INTEGER", nullable: false),
                    role = table.Column<string>(type: "TEXT", nullable: false),
                    from_utc = table.Column<DateTime>(type: "TEXT", nullable: false),
                    until_utc = table.Column<DateTime>(type: "TEXT", nullable: true)
                },
                constraints: table =>
                {
                    table.PrimaryKey("PK_person_role", x => x.id);
                    table.ForeignKey(
                        name: "FK_person_role_person_person_id",
                        column: x => x.person_id,
                        principalTable: "person",
                        principalColumn: "id",
                        onDelete: ReferentialAction.Restrict);
                });

            migrationBuilder.CreateTable(
                name: "thing_history",
                columns: table => new
                {
                    id = table.Column<int>(type: "INTEGER", nullable: false)
                        .Annotation("Sqlite:Autoincrement", true),
                    thing = table.Column<string>(type: "TEXT", nullable: false),
                    thing_id = table.Column<int>(type: "INTEGER", nullable: false),
                    version = table.Column<int>(type: "INTEGER", nullable: false),
                    edited_utc = table.Column<DateTime>(type: "TEXT", nullable: false),
                    person_id = table.Column<int>(type: "INTEGER", nullable: true),
                    before = table.Column<string>(type: "TEXT", nullable: false)
                },
                constraints: table =>
                {
                    table.PrimaryKey("PK_thing_history", x => x.id);
                    table.CheckConstraint("ck_thing_history_version", "\"version\" > 0");
                    table.ForeignKey(
                        name: "FK_thing_history_person_person_id",
                        column: x => x.person_id,
                        principalTable: "person",
                        principalColumn: "id",
                        onDelete: ReferentialAction.Restrict);
                });

            migrationBuilder.CreateTable(
                name: "blade",
                columns: table => new
                {
                    id = table.Column<int>(type: "INTEGER", nullable: false)
                        .Annotation("Sqlite:Autoincrement", true),
                    tag = table.Column<string>(type: "TEXT", nullable: false, collation: "NOCASE"),
                    spec_id = table.Column<int>(type: "INTEGER", nullable: false),
                    parent_id = table.Column<int>(type: "INTEGER", nullable: true),
                    measured_thickness_m = table.Column<double>(type: "REAL", nullable: true),
                    measured_hrc = table.Column<double>(type: "REAL", nullable: true),
                    inspect_every_h = table.Column<double>(type: "REAL", nullable: true),
                    inspect_each_mount = table.Column<bool>(type: "INTEGER", nullable: false),
                    folded = table.Column<bool>(type: "INTEGER", nullable: false),
                    added_utc = table.Column<DateTime>(type: "TEXT", nullable: false),
                    uid = table.Column<Guid>(type: "TEXT", nullable: false),
                    version = table.Column<int>(type: "INTEGER", nullable: false)
                },
                constraints: table =>
                {
                    table.PrimaryKey("PK_blade", x => x.id);
                    table.CheckConstraint("ck_blade_inspect_every_h", "\"inspect_every_h\" > 0 and \"inspect_every_h\" < 1e300");
                    table.CheckConstraint("ck_blade_measured_hrc", "\"measured_hrc\" > 0 and \"measured_hrc\" < 1e300");
                    table.CheckConstraint("ck_blade_measured_thickness_m", "\"measured_thickness_m\" > 0 and \"measured_thickness_m\" < 1e300");
                    table.CheckConstraint("ck_blade_tag", "length(tag) between 1 and 12 and tag not glob '*[^A-Za-z0-9.-]*'");
                    table.CheckConstraint("ck_blade_version", "\"version\" > 0");
                    table.ForeignKey(
                        name: "FK_blade_blade_parent_id",
                        column: x => x.parent_id,
                        principalTable: "blade",
                        principalColumn: "id",
                        onDelete: ReferentialAction.Restrict);
                    table.ForeignKey(
                        name: "FK_blade_spec_spec_id",
                        column: x => x.spec_id,
                        principalTable: "spec",
                        principalColumn: "id",
                        onDelete: ReferentialAction.Restrict);
                });

            migrationBuilder.CreateTable(
                name: "batch",
                columns: table => new
                {
                    entry_id = table.Column<int>(type: "INTEGER", nullable: false),
                    number = table.Column<string>(type: "TEXT", nullable: false),
                    service = table.Column<string>(type: "TEXT", nullable: false),
                    promised_utc = table.Column<DateTime>(type: "TEXT", nullable: true)
                },
                constraints: table =>
                {
                    table.PrimaryKey("PK_batch", x => x.entry_id);
                    table.ForeignKey(
                        name: "FK_batch_entry_entry_id",
                        column: x => x.entry_id,
                        principalTable: "entry",
                        principalColumn: "id",
                        onDelete: ReferentialAction.Restrict);
                });

            migrationBuilder.CreateTable(
                name: "import_file",
                columns: table => new
                {
                    id = table.Column<int>(type: "INTEGER", nullable: false)
                        .Annotation("Sqlite:Autoincrement", true),
                    sha256 = table.Column<string>(type: "TEXT", nullable: false),
                    kind = table.Column<string>(type: "TEXT", nullable: false),
                    rows = table.Column<int>(type: "INTEGER", nullable: false),
                    entry_id = table.Column<int>(type: "INTEGER", nullable: false)
                },
                constraints: table =>
                {
                    table.PrimaryKey("PK_import_file", x => x.id);
                    table.CheckConstraint("ck_import_file_rows", "\"rows\" >= 0");
                    table.ForeignKey(
                        name: "FK_import_file_entry_entry_id",
                        column: x => x.entry_id,
                        principalTable: "entry",
                        principalColumn: "id",
                        onDelete: ReferentialAction.Restrict);
                });

            migrationBuilder.CreateTable(
                name: "meter_epoch",
                columns: table => new
                {
                    entry_id = table.Column<int>(type: "INTEGER", nullable: false),
                    saw_id = table.Column<int>(type: "INTEGER", nullable: false),
                    reason = table.Column<string>(type: "TEXT", nullable: false),
                    start_reading_ms = table.Column<long>(type: "INTEGER", nullable: false)
                },
                constraints: table =>
                {
                    table.PrimaryKey("PK_meter_epoch", x => x.entry_id);
                    table.ForeignKey(
                        name: "FK_meter_epoch_entry_entry_id",
                        column: x => x.entry_id,
                        principalTable: "entry",
                        principalColumn: "id",
                        onDelete: ReferentialAction.Restrict);
                    table.ForeignKey(
                        name: "FK_meter_epoch_saw_saw_id",
                        column: x => x.saw_id,
                        principalTable: "saw",
                        principalColumn: "id",
                        onDelete: ReferentialAction.Restrict);
                });

            migrationBuilder.CreateTable(
                name: "queued_cut",
                columns: table => new
                {
                    id = table.Column<int>(type: "INTEGER", nullable: false)
                        .Annotation("Sqlite:Autoincrement", true),
                    number = table.Column<int>(type: "INTEGER", nullable: false),
                    job = table.Column<string>(type: "TEXT", nullable: false),
                    material = table.Column<string>(type: "TEXT", nullable: false),
                    species_key = table.Column<string>(type: "TEXT", nullable: false),
                    species_typed = table.Column<string>(type: "TEXT", nullable: false),
                    taken_as = table.Column<string>(type: "TEXT", nullable: true),
                    height_m = table.Column<double>(type: "REAL", nullable: false),
                    height_typed = table.Column<string>(type: "TEXT", nullable: true),
                    length_m = table.Column<double>(type: "REAL", nullable: false),
                    length_typed = table.Column<string>(type: "TEXT", nullable: true),
                    pieces = table.Column<int>(type: "INTEGER", nullable: false),
                    radius_m = table.Column<double>(type: "REAL", nullable: true),
                    radius_typed = table.Column<string>(type: "TEXT", nullable: true),
                    bevel_rad = table.Column<double>(type: "REAL", nullable: false),
                    moisture_pct = table.Column<double>(type: "REAL", nullable: true),
                    frozen = table.Column<bool>(type: "INTEGER", nullable: false),
                    dirt = table.Column<string>(type: "TEXT", nullable: false),
                    direction = table.Column<string>(type: "TEXT", nullable: false),
                    kind = table.Column<string>(type: "TEXT", nullable: false),
                    finish = table.Column<string>(type: "TEXT", nullable: false),
                    nail_chance = table.Column<double>(type: "REAL", nullable: false),
                    timber_minor_per_m3 = table.Column<long>(type: "INTEGER", nullable: true),
                    class_work = table.Column<bool>(type: "INTEGER", nullable: false),
                    order = table.Column<int>(type: "INTEGER", nullable: false),
                    due = table.Column<DateOnly>(type: "TEXT", nullable: true),
                    done_entry_id = table.Column<int>(type: "INTEGER", nullable: true),
                    added_utc = table.Column<DateTime>(type: "TEXT", nullable: false),
                    dropped_utc = table.Column<DateTime>(type: "TEXT", nullable: true),
                    uid = table.Column<Guid>(type: "TEXT", nullable: false),
                    version = table.Column<int>(type: "INTEGER", nullable: false)
                },
                constraints: table =>
                {
                    table.PrimaryKey("PK_queued_cut", x => x.id);
                    table.CheckConstraint("ck_queued_cut_bevel", "bevel_rad < 1.5707");
                    table.CheckConstraint("ck_queued_cut_bevel_rad", "\"bevel_rad\" >= 0 and \"bevel_rad\" < 1e300");
                    table.CheckConstraint("ck_queued_cut_height_m", "\"height_m\" > 0 and \"height_m\" < 1e300");
                    table.CheckConstraint("ck_queued_cut_length_m", "\"length_m\" > 0 and \"length_m\" < 1e300");
                    table.CheckConstraint("ck_queued_cut_moisture_pct", "\"moisture_pct\" >= 0 and \"moisture_pct\" < 1e300");
                    table.CheckConstraint("ck_queued_cut_nail", "nail_chance <= 1");
                    table.CheckConstraint("ck_queued_cut_nail_chance", "\"nail_chance\" >= 0 and \"nail_chance\" < 1e300");
                    table.CheckConstraint("ck_queued_cut_number", "\"number\" > 0");
                    table.CheckConstraint("ck_queued_cut_order", "\"order\" >= 0");
                    table.CheckConstraint("ck_queued_cut_pieces", "\"pieces\" > 0");
                    table.CheckConstraint("ck_queued_cut_radius_m", "\"radius_m\" > 0 and \"radius_m\" < 1e300");
                    table.CheckConstraint("ck_queued_cut_timber_minor_per_m3", "\"timber_minor_per_m3\" >= 0");
                    table.CheckConstraint("ck_queued_cut_version", "\"version\" > 0");
                    table.ForeignKey(
                        name: "FK_queued_cut_entry_done_entry_id",
                        column: x => x.done_entry_id,
                        principalTable: "entry",
                        principalColumn: "id",
                        onDelete: ReferentialAction.Restrict);
                });

            migrationBuilder.CreateTable(
                name: "saw_setup",
                columns: table => new
                {
                    entry_id = table.Column<int>(type: "INTEGER", nullable: false),
                    saw_id = table.Column<int>(type: "INTEGER", nullable: false),
                    loop_m = table.Column<double>(type: "REAL", nullable: false),
                    loop_least_m = table.Column<double>(type: "REAL", nullable: false),
                    loop_most_m = table.Column<double>(type: "REAL", nullable: false),
                    width_least_m = table.Column<double>(type: "REAL", nullable: false),
                    width_most_m = table.Column<double>(type: "REAL", nullable: false),
                    guide_span_least_m = table.Column<double>(type: "REAL", nullable: true),
                    guide_span_most_m = table.Column<double>(type: "REAL", nullable: true),
                    lower_guide_m = table.Column<double>(type: "REAL", nullable: false),
                    clearance_m = table.Column<double>(type: "REAL", nullable: false),
                    cut_height_most_m = table.Column<double>(type: "REAL", nullable: false),
                    longest_piece_m = table.Column<double>(type: "REAL", nullable: true),
                    takes = table.Column<string>(type: "TEXT", nullable: false),
                    class_work = table.Column<string>(type: "TEXT", nullable: false),
                    strand_force_most_n = table.Column<double>(type: "REAL", nullable: true),
                    tension_system = table.Column<string>(type: "TEXT", nullable: false),
                    tension_stiffness_n_per_m = table.Column<double>(type: "REAL", nullable: true),
                    motor_w = table.Column<double>(type: "REAL", nullable: false),
                    idle_w = table.Column<double>(type: "REAL", nullable: true),
                    feeder_n = table.Column<double>(type: "REAL", nullable: true),
                    feeder_least_mps = table.Column<double>(type: "REAL", nullable: true),
                    feeder_most_mps = table.Column<double>(type: "REAL", nullable: true),
                    change_minutes = table.Column<double>(type: "REAL", nullable: false),
                    break_cost_minor = table.Column<long>(type: "INTEGER", nullable: false),
                    tilt_most_rad = table.Column<double>(type: "REAL", nullable: false),
                    meter_factor = table.Column<double>(type: "REAL", nullable: false)
                },
                constraints: table =>
                {
                    table.PrimaryKey("PK_saw_setup", x => x.entry_id);
                    table.CheckConstraint("ck_saw_setup_break_cost_minor", "\"break_cost_minor\" >= 0");
                    table.CheckConstraint("ck_saw_setup_change_minutes", "\"change_minutes\" >= 0 and \"change_minutes\" < 1e300");
                    table.CheckConstraint("ck_saw_setup_clearance_m", "\"clearance_m\" >= 0 and \"clearance_m\" < 1e300");
                    table.CheckConstraint("ck_saw_setup_cut_height_most_m", "\"cut_height_most_m\" > 0 and \"cut_height_most_m\" < 1e300");
                    table.CheckConstraint("ck_saw_setup_feeder_least_mps", "\"feeder_least_mps\" > 0 and \"feeder_least_mps\" < 1e300");
                    table.CheckConstraint("ck_saw_setup_feeder_most_mps", "\"feeder_most_mps\" > 0 and \"feeder_most_mps\" < 1e300");
                    table.CheckConstraint("ck_saw_setup_feeder_n", "\"feeder_n\" > 0 and \"feeder_n\" < 1e300");
                    table.CheckConstraint("ck_saw_setup_guide_span_least_m", "\"guide_span_least_m\" > 0 and \"guide_span_least_m\" < 1e300");
                    table.CheckConstraint("ck_saw_setup_guide_span_most_m", "\"guide_span_most_m\" > 0 and \"guide_span_most_m\" < 1e300");
                    table.CheckConstraint("ck_saw_setup_idle_w", "\"idle_w\" >= 0 and \"idle_w\" < 1e300");
                    table.CheckConstraint("ck_saw_setup_longest_piece_m", "\"longest_piece_m\" > 0 and \"longest_piece_m\" < 1e300");
                    table.CheckConstraint("ck_saw_setup_loop", "loop_least_m <= loop_m and loop_m <= loop_most_m");
                    table.CheckConstraint("ck_saw_setup_loop_least_m", "\"loop_least_m\" > 0 and \"loop_least_m\" < 1e300");
                    table.CheckConstraint("ck_saw_setup_loop_m", "\"loop_m\" > 0 and \"loop_m\" < 1e300");
                    table.CheckConstraint("ck_saw_setup_loop_most_m", "\"loop_most_m\" > 0 and \"loop_most_m\" < 1e300");
                    table.CheckConstraint("ck_saw_setup_lower_guide_m", "\"lower_guide_m\" >= 0 and \"lower_guide_m\" < 1e300");
                    table.CheckConstraint("ck_saw_setup_meter_factor", "\"meter_factor\" > 0 and \"meter_factor\" < 1e300");
                    table.CheckConstraint("ck_saw_setup_meter_factor_range", "meter_factor <= 1");
                    table.CheckConstraint("ck_saw_setup_motor_w", "\"motor_w\" > 0 and \"motor_w\" < 1e300");
                    table.CheckConstraint("ck_saw_setup_strand_force_most_n", "\"strand_force_most_n\" > 0 and \"strand_force_most_n\" < 1e300");
                    table.CheckConstraint("ck_saw_setup_tension_stiffness_n_per_m", "\"tension_stiffness_n_per_m\" > 0 and \"tension_stiffness_n_per_m\" < 1e300");
                    table.CheckConstraint("ck_saw_setup_tilt", "tilt_most_rad < 1.5707");
                    table.CheckConstraint("ck_saw_setup_tilt_most_rad", "\"tilt_most_rad\" >= 0 and \"tilt_most_rad\" < 1e300");
                    table.CheckConstraint("ck_saw_setup_width", "width_least_m <= width_most_m");
                    table.CheckConstraint("ck_saw_setup_width_least_m", "\"width_least_m\" > 0 and \"width_least_m\" < 1e300");
                    table.CheckConstraint("ck_saw_setup_width_most_m", "\"width_most_m\" > 0 and \"width_most_m\" < 1e300");
                    table.ForeignKey(
                        name: "FK_saw_setup_entry_entry_id",
                        column: x => x.entry_id,
                        principalTable: "entry",
                        principalColumn: "id",
                        onDelete: ReferentialAction.Restrict);
                    table.ForeignKey(
                        name: "FK_saw_setup_saw_saw_id",
                        column: x => x.saw_id,
                        principalTable: "saw",
                        principalColumn: "id",
                        onDelete: ReferentialAction.Restrict);
                });

            migrationBuilder.CreateTable(
                name: "slack",
                columns: table => new
                {
                    entry_id = table.Column<int>(type: "INTEGER", nullable: false),
                    saw_id = table.Column<int>(type: "INTEGER", nullable: false),
                    let_off = table.Column<bool>(type: "INTEGER", nullable: false)
                },
                constraints: table =>
                {
                    table.PrimaryKey("PK_slack", x => x.entry_id);
                    table.ForeignKey(
                        name: "FK_slack_entry_entry_id",
                        column: x => x.entry_id,
                        principalTable: "entry",
                        principalColumn: "id",
                        onDelete: ReferentialAction.Restrict);
                    table.ForeignKey(
                        name: "FK_slack_saw_saw_id",
                        column: x => x.saw_id,
                        principalTable: "saw",
                        principalColumn: "id",
                        onDelete: ReferentialAction.Restrict);
                });

            migrationBuilder.CreateTable(
                name: "stock_move",
                columns: table => new
                {
                    entry_id = table.Column<int>(type: "INTEGER", nullable: false),
                    spec_id = table.Column<int>(type: "INTEGER", nullable: false),
                    count = table.Column<int>(type: "INTEGER", nullable: false),
                    reason = table.Column<string>(type: "TEXT", nullable: false)
                },
                constraints: table =>
                {
                    table.PrimaryKey("PK_stock_move", x => x.entry_id);
                    table.ForeignKey(
                        name: "FK_stock_move_entry_entry_id",
                        column: x => x.entry_id,
                        principalTable: "entry",
                        principalColumn: "id",
                        onDelete: ReferentialAction.Restrict);
                    table.ForeignKey(
                        name: "FK_stock_move_spec_spec_id",
                        column: x => x.spec_id,
                        principalTable: "spec",
                        principalColumn: "id",
                        onDelete: ReferentialAction.Restrict);
                });

            migrationBuilder.CreateTable(
                name: "void",
                columns: table => new
                {
                    entry_id = table.Column<int>(type: "INTEGER", nullable: false),
                    voided_id = table.Column<int>(type: "INTEGER", nullable: false),
                    reason = table.Column<string>(type: "TEXT", nullable: false)
                },
                constraints: table =>
                {
                    table.PrimaryKey("PK_void", x => x.entry_id);
                    table.CheckConstraint("ck_void_not_itself", "voided_id < entry_id");
                    table.ForeignKey(
                        name: "FK_void_entry_entry_id",
                        column: x => x.entry_id,
                        principalTable: "entry",
                        principalColumn: "id",
                        onDelete: ReferentialAction.Restrict);
                    table.ForeignKey(
                        name: "FK_void_entry_voided_id",
                        column: x => x.voided_id,
                        principalTable: "entry",
                        principalColumn: "id",
                        onDelete: ReferentialAction.Restrict);
                });

            migrationBuilder.CreateTable(
                name: "break",
                columns: table => new
                {
                    entry_id = table.Column<int>(type: "INTEGER", nullable: false),
                    blade_id = table.Column<int>(type: "INTEGER", nullable: false),
                    saw_id = table.Column<int>(type: "INTEGER", nullable: true),
                    site = table.Column<string>(type: "TEXT", nullable: false),
                    earliest_utc = table.Column<DateTime>(type: "TEXT", nullable: false),
                    latest_utc = table.Column<DateTime>(type: "TEXT", nullable: false),
                    hours_low = table.Column<double>(type: "REAL", nullable: true),
                    hours_high = table.Column<double>(type: "REAL", nullable: true),
                    minutes_lost = table.Column<double>(type: "REAL", nullable: true),
                    cost_minor = table.Column<long>(type: "INTEGER", nullable: true),
                    note = table.Column<string>(type: "TEXT", nullable: true)
                },
                constraints: table =>
                {
                    table.PrimaryKey("PK_break", x => x.entry_id);
                    table.CheckConstraint("ck_break_cost_minor", "\"cost_minor\" >= 0");
                    table.CheckConstraint("ck_break_hours", "hours_low is null or hours_high is null or hours_low <= hours_high");
                    table.CheckConstraint("ck_break_hours_high", "\"hours_high\" >= 0 and \"hours_high\" < 1e300");
                    table.CheckConstraint("ck_break_hours_low", "\"hours_low\" >= 0 and \"hours_low\" < 1e300");
                    table.CheckConstraint("ck_break_minutes_lost", "\"minutes_lost\" >= 0 and \"minutes_lost\" < 1e300");
                    table.CheckConstraint("ck_break_window", "earliest_utc <= latest_utc");
                    table.ForeignKey(
                        name: "FK_break_blade_blade_id",
                        column: x => x.blade_id,
                        principalTable: "blade",
                        principalColumn: "id",
                        onDelete: ReferentialAction.Restrict);
                    table.ForeignKey(
                        name: "FK_break_entry_entry_id",
                        column: x => x.entry_id,
                        principalTable: "entry",
                        principalColumn: "id",
                        onDelete: ReferentialAction.Restrict);
                    table.ForeignKey(
                        name: "FK_break_saw_saw_id",
                        column: x => x.saw_id,
                        principalTable: "saw",
                        principalColumn: "id",
                        onDelete: ReferentialAction.Restrict);
                });

            migrationBuilder.CreateTable(
                name: "drift",
                columns: table => new
                {
                    entry_id = table.Column<int>(type: "INTEGER", nullable: false),
                    saw_id = table.Column<int>(type: "INTEGER", nullable: false),
                    blade_id = table.Column<int>(type: "INTEGER", nullable: false),
                    angle_rad = table.Column<double>(type: "REAL", nullable: false)
                },
                constraints: table =>
                {
                    table.PrimaryKey("PK_drift", x => x.entry_id);
                    table.CheckConstraint("ck_drift_angle_rad", "\"angle_rad\" > -1e300 and \"angle_rad\" < 1e300");
                    table.ForeignKey(
                        name: "FK_drift_blade_blade_id",
                        column: x => x.blade_id,
                        principalTable: "blade",
                        principalColumn: "id",
                        onDelete: ReferentialAction.Restrict);
                    table.ForeignKey(
                        name: "FK_drift_entry_entry_id",
                        column: x => x.entry_id,
                        principalTable: "entry",
                        principalColumn: "id",
                        onDelete: ReferentialAction.Restrict);
                    table.ForeignKey(
                        name: "FK_drift_saw_saw_id",
                        column: x => x.saw_id,
                        principalTable: "saw",
                        principalColumn: "id",
                        onDelete: ReferentialAction.Restrict);
                });

            migrationBuilder.CreateTable(
                name: "hang",
                columns: table => new
                {
                    entry_id = table.Column<int>(type: "INTEGER", nullable: false),
                    blade_id = table.Column<int>(type: "INTEGER", nullable: false),
                    place = table.Column<string>(type: "TEXT", nullable: false),
                    hook = table.Column<string>(type: "TEXT", nullable: true)
                },
                constraints: table =>
                {
                    table.PrimaryKey("PK_hang", x => x.entry_id);
                    table.ForeignKey(
                        name: "FK_hang_blade_blade_id",
                        column: x => x.blade_id,
                        principalTable: "blade",
                        principalColumn: "id",
                        onDelete: ReferentialAction.Restrict);
                    table.ForeignKey(
                        name: "FK_hang_entry_entry_id",
                        column: x => x.entry_id,
                        principalTable: "entry",
                        principalColumn: "id",
                        onDelete: ReferentialAction.Restrict);
                });

            migrationBuilder.CreateTable(
                name: "hold",
                columns: table => new
                {
                    entry_id = table.Column<int>(type: "INTEGER", nullable: false),
                    blade_id = table.Column<int>(type: "INTEGER", nullable: false),
                    kind = table.Column<string>(type: "TEXT", nullable: false),
                    crack_length_m = table.Column<double>(type: "REAL", nullable: true),
                    crack_typed = table.Column<string>(type: "TEXT", nullable: true),
                    place = table.Column<string>(type: "TEXT", nullable: true),
                    note = table.Column<string>(type: "TEXT", nullable: true)
                },
                constraints: table =>
                {
                    table.PrimaryKey("PK_hold", x => x.entry_id);
                    table.CheckConstraint("ck_hold_crack_length_m", "\"crack_length_m\" >= 0 and \"crack_length_m\" < 1e300");
                    table.ForeignKey(
                        name: "FK_hold_blade_blade_id",
                        column: x => x.blade_id,
                        principalTable: "blade",
                        principalColumn: "id",
                        onDelete: ReferentialAction.Restrict);
                    table.ForeignKey(
                        name: "FK_hold_entry_entry_id",
                        column: x => x.entry_id,
                        principalTable: "entry",
                        principalColumn: "id",
                        onDelete: ReferentialAction.Restrict);
                });

            migrationBuilder.CreateTable(
                name: "inspection",
                columns: table => new
                {
                    entry_id = table.Column<int>(type: "INTEGER", nullable: false),
                    blade_id = table.Column<int>(type: "INTEGER", nullable: false),
                    found = table.Column<string>(type: "TEXT", nullable: false),
                    crack_length_m = table.Column<double>(type: "REAL", nullable: true),
                    place = table.Column<string>(type: "TEXT", nullable: true),
                    note = table.Column<string>(type: "TEXT", nullable: true)
                },
                constraints: table =>
                {
                    table.PrimaryKey("PK_inspection", x => x.entry_id);
                    table.CheckConstraint("ck_inspection_crack_length_m", "\"crack_length_m\" >= 0 and \"crack_length_m\" < 1e300");
                    table.ForeignKey(
                        name: "FK_inspection_blade_blade_id",
                        column: x => x.blade_id,
                        principalTable: "blade",
                        principalColumn: "id",
                        onDelete: ReferentialAction.Restrict);
                    table.ForeignKey(
                        name: "FK_inspection_entry_entry_id",
                        column: x => x.entry_id,
                        principalTable: "entry",
                        principalColumn: "id",
                        onDelete: ReferentialAction.Restrict);
                });

            migrationBuilder.CreateTable(
                name: "joint",
                columns: table => new
                {
                    entry_id = table.Column<int>(type: "INTEGER", nullable: false),
                    blade_id = table.Column<int>(type: "INTEGER", nullable: false),
                    loop_m = table.Column<double>(type: "REAL", nullable: false),
                    loop_typed = table.Column<string>(type: "TEXT", nullable: true),
                    quality = table.Column<string>(type: "TEXT", nullable: false),
                    method = table.Column<string>(type: "TEXT", nullable: true)
                },
                constraints: table =>
                {
                    table.PrimaryKey("PK_joint", x => x.entry_id);
                    table.CheckConstraint("ck_joint_loop_m", "\"loop_m\" > 0 and \"loop_m\" < 1e300");
                    table.ForeignKey(
                        name: "FK_joint_blade_blade_id",
                        column: x => x.blade_id,
                        principalTable: "blade",
                        principalColumn: "id",
                        onDelete: ReferentialAction.Restrict);
                    table.ForeignKey(
                        name: "FK_joint_entry_entry_id",
                        column: x => x.entry_id,
                        principalTable: "entry",
                        principalColumn: "id",
                        onDelete: ReferentialAction.Restrict);
                });

            migrationBuilder.CreateTable(
                name: "mount",
                columns: table => new
                {
                    entry_id = table.Column<int>(type: "INTEGER", nullable: false),
                    saw_id = table.Column<int>(type: "INTEGER", nullable: false),
                    blade_id = table.Column<int>(type: "INTEGER", nullable: false),
                    tension_pa = table.Column<double>(type: "REAL", nullable: true),
                    tension_typed = table.Column<string>(type: "TEXT", nullable: true),
                    tension_known = table.Column<string>(type: "TEXT", nullable: false),
                    inside_out = table.Column<bool>(type: "INTEGER", nullable: false),
                    although = table.Column<string>(type: "TEXT", nullable: true)
                },
                constraints: table =>
                {
                    table.PrimaryKey("PK_mount", x => x.entry_id);
                    table.CheckConstraint("ck_mount_tension_pa", "\"tension_pa\" > 0 and \"tension_pa\" < 1e300");
                    table.ForeignKey(
                        name: "FK_mount_blade_blade_id",
                        column: x => x.blade_id,
                        principalTable: "blade",
                        principalColumn: "id",
                        onDelete: ReferentialAction.Restrict);
                    table.ForeignKey(
                        name: "FK_mount_entry_entry_id",
                        column: x => x.entry_id,
                        principalTable: "entry",
                        principalColumn: "id",
                        onDelete: ReferentialAction.Restrict);
                    table.ForeignKey(
                        name: "FK_mount_saw_saw_id",
                        column: x => x.saw_id,
                        principalTable: "saw",
                        principalColumn: "id",
                        onDelete: ReferentialAction.Restrict);
                });

            migrationBuilder.CreateTable(
                name: "prior_use",
                columns: table => new
                {
                    entry_id = table.Column<int>(type: "INTEGER", nullable: false),
                    blade_id = table.Column<int>(type: "INTEGER", nullable: false),
                    used_low = table.Column<double>(type: "REAL", nullable: false),
                    used_high = table.Column<double>(type: "REAL", nullable: false),
                    width_m = table.Column<double>(type: "REAL", nullable: true),
                    sharpenings = table.Column<int>(type: "INTEGER", nullable: true),
                    source = table.Column<string>(type: "TEXT", nullable: true)
                },
                constraints: table =>
                {
                    table.PrimaryKey("PK_prior_use", x => x.entry_id);
                    table.CheckConstraint("ck_prior_use_range", "used_low <= used_high");
                    table.CheckConstraint("ck_prior_use_sharpenings", "\"sharpenings\" >= 0");
                    table.CheckConstraint("ck_prior_use_used_high", "\"used_high\" >= 0 and \"used_high\" < 1e300");
                    table.CheckConstraint("ck_prior_use_used_low", "\"used_low\" >= 0 and \"used_low\" < 1e300");
                    table.CheckConstraint("ck_prior_use_width_m", "\"width_m\" > 0 and \"width_m\" < 1e300");
                    table.ForeignKey(
                        name: "FK_prior_use_blade_blade_id",
                        column: x => x.blade_id,
                        principalTable: "blade",
                        principalColumn: "id",
                        onDelete: ReferentialAction.Restrict);
                    table.ForeignKey(
                        name: "FK_prior_use_entry_entry_id",
                        column: x => x.entry_id,
                        principalTable: "entry",
                        principalColumn: "id",
                        onDelete: ReferentialAction.Restrict);
                });

            migrationBuilder.CreateTable(
                name: "retag",
                columns: table => new
                {
                    entry_id = table.Column<int>(type: "INTEGER", nullable: false),
                    blade_id = table.Column<int>(type: "INTEGER", nullable: false),
                    old_tag = table.Column<string>(type: "TEXT", nullable: false),
                    new_tag = table.Column<string>(type: "TEXT", nullable: false)
                },
                constraints: table =>
                {
                    table.PrimaryKey("PK_retag", x => x.entry_id);
                    table.ForeignKey(
                        name: "FK_retag_blade_blade_id",
                        column: x => x.blade_id,
                        principalTable: "blade",
                        principalColumn: "id",
                        onDelete: ReferentialAction.Restrict);
                    table.ForeignKey(
                        name: "FK_retag_entry_entry_id",
                        column: x => x.entry_id,
                        principalTable: "entry",
                        principalColumn: "id",
                        onDelete: ReferentialAction.Restrict);
                });

            migrationBuilder.CreateTable(
                name: "retirement",
                columns: table => new
                {
                    entry_id = table.Column<int>(type: "INTEGER", nullable: false),
                    blade_id = table.Column<int>(type: "INTEGER", nullable: false),
                    reason = table.Column<string>(type: "TEXT", nullable: false),
                    cut_up = table.Column<bool>(type: "INTEGER", nullable: false),
                    note = table.Column<string>(type: "TEXT", nullable: true)
                },
                constraints: table =>
                {
                    table.PrimaryKey("PK_retirement", x => x.entry_id);
                    table.ForeignKey(
                        name: "FK_retirement_blade_blade_id",
                        column: x => x.blade_id,
                        principalTable: "blade",
                        principalColumn: "id",
                        onDelete: ReferentialAction.Restrict);
                    table.ForeignKey(
                        name: "FK_retirement_entry_entry_id",
                        column: x => x.entry_id,
                        principalTable: "entry",
                        principalColumn: "id",
                        onDelete: ReferentialAction.Restrict);
                });

            migrationBuilder.CreateTable(
                name: "split",
                columns: table => new
                {
                    entry_id = table.Column<int>(type: "INTEGER", nullable: false),
                    parent_id = table.Column<int>(type: "INTEGER", nullable: false),
                    child_id = table.Column<int>(type: "INTEGER", nullable: false),
                    width_m = table.Column<double>(type: "REAL", nullable: true)
                },
                constraints: table =>
                {
                    table.PrimaryKey("PK_split", x => x.entry_id);
                    table.CheckConstraint("ck_split_width_m", "\"width_m\" > 0 and \"width_m\" < 1e300");
                    table.ForeignKey(
                        name: "FK_split_blade_child_id",
                        column: x => x.child_id,
                        principalTable: "blade",
                        principalColumn: "id",
                        onDelete: ReferentialAction.Restrict);
                    table.ForeignKey(
                        name: "FK_split_blade_parent_id",
                        column: x => x.parent_id,
                        principalTable: "blade",
                        principalColumn: "id",
                        onDelete: ReferentialAction.Restrict);
                    table.ForeignKey(
                        name: "FK_split_entry_entry_id",
                        column: x => x.entry_id,
                        principalTable: "entry",
                        principalColumn: "id",
                        onDelete: ReferentialAction.Restrict);
                });

            migrationBuilder.CreateTable(
                name: "tag_used",
                columns: table => new
                {
                    tag = table.Column<string>(type: "TEXT", nullable: false, collation: "NOCASE"),
                    blade_id = table.Column<int>(type: "INTEGER", nullable: false)
                },
                constraints: table =>
                {
                    table.PrimaryKey("PK_tag_used", x => x.tag);
                    table.ForeignKey(
                        name: "FK_tag_used_blade_blade_id",
                        column: x => x.blade_id,
                        principalTable: "blade",
                        principalColumn: "id",
                        onDelete: ReferentialAction.Restrict);
                });

            migrationBuilder.CreateTable(
                name: "tension_reading",
                columns: table => new
                {
                    entry_id = table.Column<int>(type: "INTEGER", nullable: false),
                    saw_id = table.Column<int>(type: "INTEGER", nullable: false),
                    blade_id = table.Column<int>(type: "INTEGER", nullable: false),
                    tension_pa = table.Column<double>(type: "REAL", nullable: false),
                    typed = table.Column<string>(type: "TEXT", nullable: false),
                    how = table.Column<string>(type: "TEXT", nullable: false)
                },
                constraints: table =>
                {
                    table.PrimaryKey("PK_tension_reading", x => x.entry_id);
                    table.CheckConstraint("ck_tension_reading_tension_pa", "\"tension_pa\" > 0 and \"tension_pa\" < 1e300");
                    table.ForeignKey(
                        name: "FK_tension_reading_blade_blade_id",
                        column: x => x.blade_id,
                        principalTable: "blade",
                        principalColumn: "id",
                        onDelete: ReferentialAction.Restrict);
                    table.ForeignKey(
                        name: "FK_tension_reading_entry_entry_id",
                        column: x => x.entry_id,
                        principalTable: "entry",
                        principalColumn: "id",
                        onDelete: ReferentialAction.Restrict);
                    table.ForeignKey(
                        name: "FK_tension_reading_saw_saw_id",
                        column: x => x.saw_id,
                        principalTable: "saw",
                        principalColumn: "id",
                        onDelete: ReferentialAction.Restrict);
                });

            migrationBuilder.CreateTable(
                name: "batch_line",
                columns: table => new
                {
                    entry_id = table.Column<int>(type: "INTEGER", nullable: false),
                    batch_id = table.Column<int>(type: "INTEGER", nullable: false),
                    blade_id = table.Column<int>(type: "INTEGER", nullable: false)
                },
                constraints: table =>
                {
                    table.PrimaryKey("PK_batch_line", x => x.entry_id);
                    table.ForeignKey(
                        name: "FK_batch_line_batch_batch_id",
                        column: x => x.batch_id,
                        principalTable: "batch",
                        principalColumn: "entry_id",
                        onDelete: ReferentialAction.Restrict);
                    table.ForeignKey(
                        name: "FK_batch_line_blade_blade_id",
                        column: x => x.blade_id,
                        principalTable: "blade",
                        principalColumn: "id",
                        onDelete: ReferentialAction.Restrict);
                    table.ForeignKey(
                        name: "FK_batch_line_entry_entry_id",
                        column: x => x.entry_id,
                        principalTable: "entry",
                        principalColumn: "id",
                        onDelete: ReferentialAction.Restrict);
                });

            migrationBuilder.CreateTable(
                name: "sharpening",
                columns: table => new
                {
                    entry_id = table.Column<int>(type: "INTEGER", nullable: false),
                    blade_id = table.Column<int>(type: "INTEGER", nullable: false),
                    kind = table.Column<string>(type: "TEXT", nullable: false),
                    set_again = table.Column<bool>(type: "INTEGER", nullable: false),
                    width_m = table.Column<double>(type: "REAL", nullable: true),
                    width_typed = table.Column<string>(type: "TEXT", nullable: true),
                    gullet_m = table.Column<double>(type: "REAL", nullable: true),
                    kerf_m = table.Column<double>(type: "REAL", nullable: true),
                    edge_after_m = table.Column<double>(type: "REAL", nullable: true),
                    price_minor = table.Column<long>(type: "INTEGER", nullable: true),
                    batch_id = table.Column<int>(type: "INTEGER", nullable: true)
                },
                constraints: table =>
                {
                    table.PrimaryKey("PK_sharpening", x => x.entry_id);
                    table.CheckConstraint("ck_sharpening_edge_after_m", "\"edge_after_m\" > 0 and \"edge_after_m\" < 1e300");
                    table.CheckConstraint("ck_sharpening_gullet", "gullet_m is null or width_m is null or gullet_m < width_m");
                    table.CheckConstraint("ck_sharpening_gullet_m", "\"gullet_m\" > 0 and \"gullet_m\" < 1e300");
                    table.CheckConstraint("ck_sharpening_kerf_m", "\"kerf_m\" > 0 and \"kerf_m\" < 1e300");
                    table.CheckConstraint("ck_sharpening_price_minor", "\"price_minor\" >= 0");
                    table.CheckConstraint("ck_sharpening_width_m", "\"width_m\" > 0 and \"width_m\" < 1e300");
                    table.ForeignKey(
                        name: "FK_sharpening_batch_batch_id",
                        column: x => x.batch_id,
                        principalTable: "batch",
                        principalColumn: "entry_id",
                        onDelete: ReferentialAction.Restrict);
                    table.ForeignKey(
                        name: "FK_sharpening_blade_blade_id",
                        column: x => x.blade_id,
                        principalTable: "blade",
                        principalColumn: "id",
                        onDelete: ReferentialAction.Restrict);
                    table.ForeignKey(
                        name: "FK_sharpening_entry_entry_id",
                        column: x => x.entry_id,
                        principalTable: "entry",
                        principalColumn: "id",
                        onDelete: ReferentialAction.Restrict);
                });

            migrationBuilder.CreateTable(
                name: "meter_reading",
                columns: table => new
                {
                    entry_id = table.Column<int>(type: "INTEGER", nullable: false),
                    saw_id = table.Column<int>(type: "INTEGER", nullable: false),
                    epoch_id = table.Column<int>(type: "INTEGER", nullable: false),
                    reading_ms = table.Column<long>(type: "INTEGER", nullable: false),
                    reading_typed = table.Column<string>(type: "TEXT", nullable: false)
                },
                constraints: table =>
                {
                    table.PrimaryKey("PK_meter_reading", x => x.entry_id);
                    table.CheckConstraint("ck_meter_reading_reading_ms", "\"reading_ms\" >= 0");
                    table.ForeignKey(
                        name: "FK_meter_reading_entry_entry_id",
                        column: x => x.entry_id,
                        principalTable: "entry",
                        principalColumn: "id",
                        onDelete: ReferentialAction.Restrict);
                    table.ForeignKey(
                        name: "FK_meter_reading_meter_epoch_epoch_id",
                        column: x => x.epoch_id,
                        principalTable: "meter_epoch",
                        principalColumn: "entry_id",
                        onDelete: ReferentialAction.Restrict);
                    table.ForeignKey(
                        name: "FK_meter_reading_saw_saw_id",
                        column: x => x.saw_id,
                        principalTable: "saw",
                        principalColumn: "id",
                        onDelete: ReferentialAction.Restrict);
                });

            migrationBuilder.CreateTable(
                name: "cut_done",
                columns: table => new
                {
                    entry_id = table.Column<int>(type: "INTEGER", nullable: false),
                    saw_id = table.Column<int>(type: "INTEGER", nullable: false),
                    queued_cut_id = table.Column<int>(type: "INTEGER", nullable: true),
                    material = table.Column<string>(type: "TEXT", nullable: false),
                    species_key = table.Column<string>(type: "TEXT", nullable: false),
                    species_typed = table.Column<string>(type: "TEXT", nullable: false),
                    wood_class = table.Column<string>(type: "TEXT", nullable: false),
                    height_m = table.Column<double>(type: "REAL", nullable: false),
                    height_typed = table.Column<string>(type: "TEXT", nullable: true),
                    length_m = table.Column<double>(type: "REAL", nullable: false),
                    length_typed = table.Column<string>(type: "TEXT", nullable: true),
                    pieces = table.Column<int>(type: "INTEGER", nullable: false),
                    feed_mps = table.Column<double>(type: "REAL", nullable: false),
                    feed_grade = table.Column<string>(type: "TEXT", nullable: false),
                    speed_mps = table.Column<double>(type: "REAL", nullable: false),
                    moisture_pct = table.Column<double>(type: "REAL", nullable: true),
                    frozen = table.Column<bool>(type: "INTEGER", nullable: false),
                    dirt = table.Column<string>(type: "TEXT", nullable: false),
                    nail = table.Column<bool>(type: "INTEGER", nullable: false)
                },
                constraints: table =>
                {
                    table.PrimaryKey("PK_cut_done", x => x.entry_id);
                    table.CheckConstraint("ck_cut_done_feed_mps", "\"feed_mps\" > 0 and \"feed_mps\" < 1e300");
                    table.CheckConstraint("ck_cut_done_height_m", "\"height_m\" > 0 and \"height_m\" < 1e300");
                    table.CheckConstraint("ck_cut_done_length_m", "\"length_m\" > 0 and \"length_m\" < 1e300");
                    table.CheckConstraint("ck_cut_done_moisture_pct", "\"moisture_pct\" >= 0 and \"moisture_pct\" < 1e300");
                    table.CheckConstraint("ck_cut_done_pieces", "\"pieces\" > 0");
                    table.CheckConstraint("ck_cut_done_speed_mps", "\"speed_mps\" > 0 and \"speed_mps\" < 1e300");
                    table.ForeignKey(
                        name: "FK_cut_done_entry_entry_id",
                        column: x => x.entry_id,
                        principalTable: "entry",
                        principalColumn: "id",
                        onDelete: ReferentialAction.Restrict);
                    table.ForeignKey(
                        name: "FK_cut_done_queued_cut_queued_cut_id",
                        column: x => x.queued_cut_id,
                        principalTable: "queued_cut",
                        principalColumn: "id",
                        onDelete: ReferentialAction.Restrict);
                    table.ForeignKey(
                        name: "FK_cut_done_saw_saw_id",
                        column: x => x.saw_id,
                        principalTable: "saw",
                        principalColumn: "id",
                        onDelete: ReferentialAction.Restrict);
                });

            migrationBuilder.CreateTable(
                name: "setup_speed",
                columns: table => new
                {
                    id = table.Column<int>(type: "INTEGER", nullable: false)
                        .Annotation("Sqlite:Autoincrement", true),
                    setup_id = table.Column<int>(type: "INTEGER", nullable: false),
                    position = table.Column<int>(type: "INTEGER", nullable: false),
                    speed_mps = table.Column<double>(type: "REAL", nullable: false),
                    speed_typed = table.Column<string>(type: "TEXT", nullable: true),
                    usual = table.Column<bool>(type: "INTEGER", nullable: false)
                },
                constraints: table =>
                {
                    table.PrimaryKey("PK_setup_speed", x => x.id);
                    table.CheckConstraint("ck_setup_speed_position", "\"position\" >= 0");
                    table.CheckConstraint("ck_setup_speed_speed_mps", "\"speed_mps\" > 0 and \"speed_mps\" < 1e300");
                    table.ForeignKey(
                        name: "FK_setup_speed_saw_setup_setup_id",
                        column: x => x.setup_id,
                        principalTable: "saw_setup",
                        principalColumn: "entry_id",
                        onDelete: ReferentialAction.Restrict);
                });

            migrationBuilder.CreateTable(
                name: "setup_wheel",
                columns: table => new
                {
                    id = table.Column<int>(type: "INTEGER", nullable: false)
                        .Annotation("Sqlite:Autoincrement", true),
                    setup_id = table.Column<int>(type: "INTEGER", nullable: false),
                    position = table.Column<int>(type: "INTEGER", nullable: false),
                    diameter_m = table.Column<double>(type: "REAL", nullable: false),
                    diameter_typed = table.Column<string>(type: "TEXT", nullable: true),
                    driven = table.Column<bool>(type: "INTEGER", nullable: false)
                },
                constraints: table =>
                {
                    table.PrimaryKey("PK_setup_wheel", x => x.id);
                    table.CheckConstraint("ck_setup_wheel_diameter_m", "\"diameter_m\" > 0 and \"diameter_m\" < 1e300");
                    table.CheckConstraint("ck_setup_wheel_position", "\"position\" >= 0");
                    table.ForeignKey(
                        name: "FK_setup_wheel_saw_setup_setup_id",
                        column: x => x.setup_id,
                        principalTable: "saw_setup",
                        principalColumn: "entry_id",
                        onDelete: ReferentialAction.Restrict);
                });

            migrationBuilder.CreateTable(
                name: "hold_cleared",
                columns: table => new
                {
                    entry_id = table.Column<int>(type: "INTEGER", nullable: false),
                    hold_id = table.Column<int>(type: "INTEGER", nullable: false),
                    how = table.Column<string>(type: "TEXT", nullable: false)
                },
                constraints: table =>
                {
                    table.PrimaryKey("PK_hold_cleared", x => x.entry_id);
                    table.ForeignKey(
                        name: "FK_hold_cleared_entry_entry_id",
                        column: x => x.entry_id,
                        principalTable: "entry",
                        principalColumn: "id",
                        onDelete: ReferentialAction.Restrict);
                    table.ForeignKey(
                        name: "FK_hold_cleared_hold_hold_id",
                        column: x => x.hold_id,
                        principalTable: "hold",
                        principalColumn: "entry_id",
                        onDelete: ReferentialAction.Restrict);
                });

            migrationBuilder.CreateTable(
                name: "blade_now",
                columns: table => new
                {
                    blade_id = table.Column<int>(type: "INTEGER", nullable: false),
                    place = table.Column<string>(type: "TEXT", nullable: false),
                    saw_id = table.Column<int>(type: "INTEGER", nullable: true),
                    hook = table.Column<string>(type: "TEXT", nullable: true),
                    width_m = table.Column<double>(type: "REAL", nullable: false),
                    loop_m = table.Column<double>(type: "REAL", nullable: true),
                    joint_id = table.Column<int>(type: "INTEGER", nullable: true),
                    hold_id = table.Column<int>(type: "INTEGER", nullable: true)
                },
                constraints: table =>
                {
                    table.PrimaryKey("PK_blade_now", x => x.blade_id);
                    table.CheckConstraint("ck_blade_now_loop_m", "\"loop_m\" > 0 and \"loop_m\" < 1e300");
                    table.CheckConstraint("ck_blade_now_width_m", "\"width_m\" > 0 and \"width_m\" < 1e300");
                    table.ForeignKey(
                        name: "FK_blade_now_blade_blade_id",
                        column: x => x.blade_id,
                        principalTable: "blade",
                        principalColumn: "id",
                        onDelete: ReferentialAction.Restrict);
                    table.ForeignKey(
                        name: "FK_blade_now_hold_hold_id",
                        column: x => x.hold_id,
                        principalTable: "hold",
                        principalColumn: "entry_id",
                        onDelete: ReferentialAction.Restrict);
                    table.ForeignKey(
                        name: "FK_blade_now_joint_joint_id",
                        column: x => x.joint_id,
                        principalTable: "joint",
                        principalColumn: "entry_id",
                        onDelete: ReferentialAction.Restrict);
                    table.ForeignKey(
                        name: "FK_blade_now_saw_saw_id",
                        column: x => x.saw_id,
                        principalTable: "saw",
                        principalColumn: "id",
                        onDelete: ReferentialAction.Restrict);
                });

            migrationBuilder.CreateTable(
                name: "dismount",
                columns: table => new
                {
                    entry_id = table.Column<int>(type: "INTEGER", nullable: false),
                    mount_id = table.Column<int>(type: "INTEGER", nullable: false),
                    reason = table.Column<string>(type: "TEXT", nullable: false)
                },
                constraints: table =>
                {
                    table.PrimaryKey("PK_dismount", x => x.entry_id);
                    table.ForeignKey(
                        name: "FK_dismount_entry_entry_id",
                        column: x => x.entry_id,
                        principalTable: "entry",
                        principalColumn: "id",
                        onDelete: ReferentialAction.Restrict);
                    table.ForeignKey(
                        name: "FK_dismount_mount_mount_id",
                        column: x => x.mount_id,
                        principalTable: "mount",
                        principalColumn: "entry_id",
                        onDelete: ReferentialAction.Restrict);
                });

            migrationBuilder.CreateTable(
                name: "exposure",
                columns: table => new
                {
                    id = table.Column<int>(type: "INTEGER", nullable: false)
                        .Annotation("Sqlite:Autoincrement", true),
                    mount_id = table.Column<int>(type: "INTEGER", nullable: false),
                    setup_id = table.Column<int>(type: "INTEGER", nullable: false),
                    speed_mps = table.Column<double>(type: "REAL", nullable: false),
                    running_ms = table.Column<long>(type: "INTEGER", nullable: false)
                },
                constraints: table =>
                {
                    table.PrimaryKey("PK_exposure", x => x.id);
                    table.CheckConstraint("ck_exposure_running_ms", "\"running_ms\" > 0");
                    table.CheckConstraint("ck_exposure_speed_mps", "\"speed_mps\" > 0 and \"speed_mps\" < 1e300");
                    table.ForeignKey(
                        name: "FK_exposure_mount_mount_id",
                        column: x => x.mount_id,
                        principalTable: "mount",
                        principalColumn: "entry_id",
                        onDelete: ReferentialAction.Restrict);
                    table.ForeignKey(
                        name: "FK_exposure_saw_setup_setup_id",
                        column: x => x.setup_id,
                        principalTable: "saw_setup",
                        principalColumn: "entry_id",
                        onDelete: ReferentialAction.Restrict);
                });

            migrationBuilder.CreateTable(
                name: "on_saw",
                columns: table => new
                {
                    saw_id = table.Column<int>(type: "INTEGER", nullable: false),
                    blade_id = table.Column<int>(type: "INTEGER", nullable: false),
                    mount_id = table.Column<int>(type: "INTEGER", nullable: false)
                },
                constraints: table =>
                {
                    table.PrimaryKey("PK_on_saw", x => x.saw_id);
                    table.ForeignKey(
                        name: "FK_on_saw_blade_blade_id",
                        column: x => x.blade_id,
                        principalTable: "blade",
                        principalColumn: "id",
                        onDelete: ReferentialAction.Restrict);
                    table.ForeignKey(
                        name: "FK_on_saw_mount_mount_id",
                        column: x => x.mount_id,
                        principalTable: "mount",
                        principalColumn: "entry_id",
                        onDelete: ReferentialAction.Restrict);
                    table.ForeignKey(
                        name: "FK_on_saw_saw_saw_id",
                        column: x => x.saw_id,
                        principalTable: "saw",
                        principalColumn: "id",
                        onDelete: ReferentialAction.Restrict);
                });

            migrationBuilder.CreateTable(
                name: "wood_path",
                columns: table => new
                {
                    id = table.Column<int>(type: "INTEGER", nullable: false)
                        .Annotation("Sqlite:Autoincrement", true),
                    mount_id = table.Column<int>(type: "INTEGER", nullable: false),
                    wood_class = table.Column<string>(type: "TEXT", nullable: false),
                    dirt = table.Column<string>(type: "TEXT", nullable: false),
                    path_mm = table.Column<long>(type: "INTEGER", nullable: false),
                    area_mm2 = table.Column<long>(type: "INTEGER", nullable: false),
                    cut_ms = table.Column<long>(type: "INTEGER", nullable: false)
                },
                constraints: table =>
                {
                    table.PrimaryKey("PK_wood_path", x => x.id);
                    table.CheckConstraint("ck_wood_path_area_mm2", "\"area_mm2\" >= 0");
                    table.CheckConstraint("ck_wood_path_cut_ms", "\"cut_ms\" >= 0");
                    table.CheckConstraint("ck_wood_path_path_mm", "\"path_mm\" >= 0");
                    table.ForeignKey(
                        name: "FK_wood_path_mount_mount_id",
                        column: x => x.mount_id,
                        principalTable: "mount",
                        principalColumn: "entry_id",
                        onDelete: ReferentialAction.Restrict);
                });

            migrationBuilder.CreateTable(
                name: "batch_return",
                columns: table => new
                {
                    entry_id = table.Column<int>(type: "INTEGER", nullable: false),
                    line_id = table.Column<int>(type: "INTEGER", nullable: false),
                    outcome = table.Column<string>(type: "TEXT", nullable: false),
                    width_m = table.Column<double>(type: "REAL", nullable: true)
                },
                constraints: table =>
                {
                    table.PrimaryKey("PK_batch_return", x => x.entry_id);
                    table.CheckConstraint("ck_batch_return_width_m", "\"width_m\" > 0 and \"width_m\" < 1e300");
                    table.ForeignKey(
                        name: "FK_batch_return_batch_line_line_id",
                        column: x => x.line_id,
                        principalTable: "batch_line",
                        principalColumn: "entry_id",
                        onDelete: ReferentialAction.Restrict);
                    table.ForeignKey(
                        name: "FK_batch_return_entry_entry_id",
                        column: x => x.entry_id,
                        principalTable: "entry",
                        principalColumn: "id",
                        onDelete: ReferentialAction.Restrict);
                });

            migrationBuilder.CreateTable(
                name: "run",
                columns: table => new
                {
                    entry_id = table.Column<int>(type: "INTEGER", nullable: false),
                    saw_id = table.Column<int>(type: "INTEGER", nullable: false),
                    from_utc = table.Column<DateTime>(type: "TEXT", nullable: false),
                    until_utc = table.Column<DateTime>(type: "TEXT", nullable: false),
                    running_ms = table.Column<long>(type: "INTEGER", nullable: false),
                    running_typed = table.Column<string>(type: "TEXT", nullable: true),
                    speed_mps = table.Column<double>(type: "REAL", nullable: false),
                    grade = table.Column<string>(type: "TEXT", nullable: false),
                    source = table.Column<string>(type: "TEXT", nullable: false),
                    reading_id = table.Column<int>(type: "INTEGER", nullable: true)
                },
                constraints: table =>
                {
                    table.PrimaryKey("PK_run", x => x.entry_id);
                    table.CheckConstraint("ck_run_running_ms", "\"running_ms\" > 0");
                    table.CheckConstraint("ck_run_speed_mps", "\"speed_mps\" > 0 and \"speed_mps\" < 1e300");
                    table.CheckConstraint("ck_run_window", "from_utc < until_utc");
                    table.ForeignKey(
                        name: "FK_run_entry_entry_id",
                        column: x => x.entry_id,
                        principalTable: "entry",
                        principalColumn: "id",
                        onDelete: ReferentialAction.Restrict);
                    table.ForeignKey(
                        name: "FK_run_meter_reading_reading_id",
                        column: x => x.reading_id,
                        principalTable: "meter_reading",
                        principalColumn: "entry_id",
                        onDelete: ReferentialAction.Restrict);
                    table.ForeignKey(
                        name: "FK_run_saw_saw_id",
                        column: x => x.saw_id,
                        principalTable: "saw",
                        principalColumn: "id",
                        onDelete: ReferentialAction.Restrict);
                });

            migrationBuilder.CreateTable(
                name: "run_share",
                columns: table => new
                {
                    id = table.Column<int>(type: "INTEGER", nullable: false)
                        .Annotation("Sqlite:Autoincrement", true),
                    run_id = table.Column<int>(type: "INTEGER", nullable: false),
                    mount_id = table.Column<int>(type: "INTEGER", nullable: true),
                    setup_id = table.Column<int>(type: "INTEGER", nullable: false),
                    ms = table.Column<long>(type: "INTEGER", nullable: false)
                },
                constraints: table =>
                {
                    table.PrimaryKey("PK_run_share", x => x.id);
                    table.CheckConstraint("ck_run_share_ms", "\"ms\" > 0");
                    table.ForeignKey(
                        name: "FK_run_share_mount_mount_id",
                        column: x => x.mount_id,
                        principalTable: "mount",
                        principalColumn: "entry_id",
                        onDelete: ReferentialAction.Restrict);
                    table.ForeignKey(
                        name: "FK_run_share_run_run_id",
                        column: x => x.run_id,
                        principalTable: "run",
                        principalColumn: "entry_id",
                        onDelete: ReferentialAction.Restrict);
                    table.ForeignKey(
                        name: "FK_run_share_saw_setup_setup_id",
                        column: x => x.setup_id,
                        principalTable: "saw_setup",
                        principalColumn: "entry_id",
                        onDelete: ReferentialAction.Restrict);
                });

            migrationBuilder.CreateIndex(
                name: "IX_batch_number",
                table: "batch",
                column: "number");

            migrationBuilder.CreateIndex(
                name: "IX_batch_line_batch_id",
                table: "batch_line",
                column: "batch_id");

            migrationBuilder.CreateIndex(
                name: "IX_batch_line_blade_id",
                table: "batch_line",
                column: "blade_id");

            migrationBuilder.CreateIndex(
                name: "IX_batch_return_line_id",
                table: "batch_return",
                column: "line_id");

            migrationBuilder.CreateIndex(
                name: "IX_blade_parent_id",
                table: "blade",
                column: "parent_id");

            migrationBuilder.CreateIndex(
                name: "IX_blade_spec_id",
                table: "blade",
                column: "spec_id");

            migrationBuilder.CreateIndex(
                name: "IX_blade_tag",
                table: "blade",
                column: "tag",
                unique: true);

            migrationBuilder.CreateIndex(
                name: "IX_blade_uid",
                table: "blade",
                column: "uid",
                unique: true);

            migrationBuilder.CreateIndex(
                name: "IX_blade_now_hold_id",
                table: "blade_now",
                column: "hold_id");

            migrationBuilder.CreateIndex(
                name: "IX_blade_now_joint_id",
                table: "blade_now",
                column: "joint_id");

            migrationBuilder.CreateIndex(
                name: "IX_blade_now_saw_id",
                table: "blade_now",
                column: "saw_id");

            migrationBuilder.CreateIndex(
                name: "IX_break_blade_id",
                table: "break",
                column: "blade_id");

            migrationBuilder.CreateIndex(
                name: "IX_break_saw_id",
                table: "break",
                column: "saw_id");

            migrationBuilder.CreateIndex(
                name: "IX_cut_done_queued_cut_id",
                table: "cut_done",
                column: "queued_cut_id");

            migrationBuilder.CreateIndex(
                name: "IX_cut_done_saw_id",
                table: "cut_done",
                column: "saw_id");

            migrationBuilder.CreateIndex(
                name: "IX_dismount_mount_id",
                table: "dismount",
                column: "mount_id");

            migrationBuilder.CreateIndex(
                name: "IX_drift_blade_id",
                table: "drift",
                column: "blade_id");

            migrationBuilder.CreateIndex(
                name: "IX_drift_saw_id",
                table: "drift",
                column: "saw_id");

            migrationBuilder.CreateIndex(
                name: "IX_entry_at_utc",
                table: "entry",
                column: "at_utc");

            migrationBuilder.CreateIndex(
                name: "IX_entry_op_part",
                table: "entry",
                columns: new[] { "op", "part" },
                unique: true);

            migrationBuilder.CreateIndex(
                name: "IX_entry_person_id",
                table: "entry",
                column: "person_id");

            migrationBuilder.CreateIndex(
                name: "IX_exposure_setup_id",
                table: "exposure",
                column: "setup_id");

            migrationBuilder.CreateIndex(
                name: "ix_exposure_covering",
                table: "exposure",
                columns: new[] { "mount_id", "setup_id", "speed_mps", "running_ms" });

            migrationBuilder.CreateIndex(
                name: "IX_hang_blade_id",
                table: "hang",
                column: "blade_id");

            migrationBuilder.CreateIndex(
                name: "IX_hold_blade_id",
                table: "hold",
                column: "blade_id");

            migrationBuilder.CreateIndex(
                name: "IX_hold_cleared_hold_id",
                table: "hold_cleared",
                column: "hold_id");

            migrationBuilder.CreateIndex(
                name: "IX_import_file_entry_id",
                table: "import_file",
                column: "entry_id");

            migrationBuilder.CreateIndex(
                name: "IX_import_file_sha256",
                table: "import_file",
                column: "sha256",
                unique: true);

            migrationBuilder.CreateIndex(
                name: "IX_inspection_blade_id",
                table: "inspection",
                column: "blade_id");

            migrationBuilder.CreateIndex(
                name: "IX_joint_blade_id",
                table: "joint",
                column: "blade_id");

            migrationBuilder.CreateIndex(
                name: "IX_meter_epoch_saw_id",
                table: "meter_epoch",
                column: "saw_id");

            migrationBuilder.CreateIndex(
                name: "IX_meter_reading_epoch_id",
                table: "meter_reading",
                column: "epoch_id");

            migrationBuilder.CreateIndex(
                name: "IX_meter_reading_saw_id",
                table: "meter_reading",
                column: "saw_id");

            migrationBuilder.CreateIndex(
                name: "IX_mount_blade_id",
                table: "mount",
                column: "blade_id");

            migrationBuilder.CreateIndex(
                name: "IX_mount_saw_id",
                table: "mount",
                column: "saw_id");

            migrationBuilder.CreateIndex(
                name: "IX_on_saw_blade_id",
                table: "on_saw",
                column: "blade_id",
                unique: true);

            migrationBuilder.CreateIndex(
                name: "IX_on_saw_mount_id",
                table: "on_saw",
                column: "mount_id");

            migrationBuilder.CreateIndex(
                name: "IX_person_initials",
                table: "person",
                column: "initials",
                unique: true);

            migrationBuilder.CreateIndex(
                name: "IX_person_uid",
                table: "person",
                column: "uid",
                unique: true);

            migrationBuilder.CreateIndex(
                name: "IX_person_role_person_id",
                table: "person_role",
                column: "person_id");

            migrationBuilder.CreateIndex(
                name: "IX_prior_use_blade_id",
                table: "prior_use",
                column: "blade_id");

            migrationBuilder.CreateIndex(
                name: "IX_queued_cut_done_entry_id",
                table: "queued_cut",
                column: "done_entry_id");

            migrationBuilder.CreateIndex(
                name: "IX_queued_cut_number",
                table: "queued_cut",
                column: "number",
                unique: true);

            migrationBuilder.CreateIndex(
                name: "IX_queued_cut_uid",
                table: "queued_cut",
                column: "uid",
                unique: true);

            migrationBuilder.CreateIndex(
                name: "IX_retag_blade_id",
                table: "retag",
                column: "blade_id");

            migrationBuilder.CreateIndex(
                name: "IX_retirement_blade_id",
                table: "retirement",
                column: "blade_id");

            migrationBuilder.CreateIndex(
                name: "IX_run_reading_id",
                table: "run",
                column: "reading_id");

            migrationBuilder.CreateIndex(
                name: "IX_run_saw_id_until_utc_from_utc",
                table: "run",
                columns: new[] { "saw_id", "until_utc", "from_utc" });

            migrationBuilder.CreateIndex(
                name: "IX_run_share_mount_id",
                table: "run_share",
                column: "mount_id");

            migrationBuilder.CreateIndex(
                name: "IX_run_share_run_id",
                table: "run_share",
                column: "run_id");

            migrationBuilder.CreateIndex(
                name: "IX_run_share_setup_id",
                table: "run_share",
                column: "setup_id");

            migrationBuilder.CreateIndex(
                name: "IX_saw_code",
                table: "saw",
                column: "code",
                unique: true);

            migrationBuilder.CreateIndex(
                name: "IX_saw_uid",
                table: "saw",
                column: "uid",
                unique: true);

            migrationBuilder.CreateIndex(
                name: "IX_saw_setup_saw_id",
                table: "saw_setup",
                column: "saw_id");

            migrationBuilder.CreateIndex(
                name: "IX_setup_speed_setup_id",
                table: "setup_speed",
                column: "setup_id");

            migrationBuilder.CreateIndex(
                name: "IX_setup_wheel_setup_id",
                table: "setup_wheel",
                column: "setup_id");

            migrationBuilder.CreateIndex(
                name: "IX_sharpening_batch_id",
                table: "sharpening",
                column: "batch_id");

            migrationBuilder.CreateIndex(
                name: "IX_sharpening_blade_id",
                table: "sharpening",
                column: "blade_id");

            migrationBuilder.CreateIndex(
                name: "IX_shop_uid",
                table: "shop",
                column: "uid",
                unique: true);

            migrationBuilder.CreateIndex(
                name: "IX_slack_saw_id",
                table: "slack",
                column: "saw_id");

            migrationBuilder.CreateIndex(
                name: "IX_spec_code",
                table: "spec",
                column: "code",
                unique: true);

            migrationBuilder.CreateIndex(
                name: "IX_spec_uid",
                table: "spec",
                column: "uid",
                unique: true);

            migrationBuilder.CreateIndex(
                name: "IX_split_child_id",
                table: "split",
                column: "child_id");

            migrationBuilder.CreateIndex(
                name: "IX_split_parent_id",
                table: "split",
                column: "parent_id");

            migrationBuilder.CreateIndex(
                name: "IX_stock_move_spec_id",
                table: "stock_move",
                column: "spec_id");

            migrationBuilder.CreateIndex(
                name: "IX_tag_used_blade_id",
                table: "tag_used",
                column: "blade_id");

            migrationBuilder.CreateIndex(
                name: "IX_tension_reading_blade_id",
                table: "tension_reading",
                column: "blade_id");

            migrationBuilder.CreateIndex(
                name: "IX_tension_reading_saw_id",
                table: "tension_reading",
                column: "saw_id");

            migrationBuilder.CreateIndex(
                name: "IX_thing_history_person_id",
                table: "thing_history",
                column: "person_id");

            migrationBuilder.CreateIndex(
                name: "IX_thing_history_thing_thing_id",
                table: "thing_history",
                columns: new[] { "thing", "thing_id" });

            migrationBuilder.CreateIndex(
                name: "IX_void_voided_id",
                table: "void",
                column: "voided_id",
                unique: true);

            migrationBuilder.CreateIndex(
                name: "IX_wood_path_mount_id_wood_class_dirt",
                table: "wood_path",
                columns: new[] { "mount_id", "wood_class", "dirt" },
                unique: true);

            FirstTriggers.Up(migrationBuilder);
        }

        /// <inheritdoc />
        protected override void Down(MigrationBuilder migrationBuilder)
        {
            migrationBuilder.DropTable(
                name: "batch_return");

            migrationBuilder.DropTable(
                name: "blade_now");

            migrationBuilder.DropTable(
                name: "break");

            migrationBuilder.DropTable(
                name: "cut_done");

            migrationBuilder.DropTable(
                name: "dismount");

            migrationBuilder.DropTable(
                name: "drift");

            migrationBuilder.DropTable(
                name: "exposure");

            migrationBuilder.DropTable(
                name: "hang");

            migrationBuilder.DropTable(
                name: "hold_cleared");

            migrationBuilder.DropTable(
                name: "import_file");

            migrationBuilder.DropTable(
                name: "inspection");

            migrationBuilder.DropTable(
                name: "on_saw");

            migrationBuilder.DropTable(
                name: "person_role");

            migrationBuilder.DropTable(
                name: "prior_use");

            migrationBuilder.DropTable(
                name: "retag");

            migrationBuilder.DropTable(
                name: "retirement");

            migrationBuilder.DropTable(
                name: "run_share");

            migrationBuilder.DropTable(
                name: "setting");

            migrationBuilder.DropTable(
                name: "setup_speed");

            migrationBuilder.DropTable(
                name: "setup_wheel");

            migrationBuilder.DropTable(
                name: "sharpening");

            migrationBuilder.DropTable(
                name: "shop");

            migrationBuilder.DropTable(
                name: "slack");

            migrationBuilder.DropTable(
                name: "split");

            migrationBuilder.DropTable(
                name: "stock_move");

            migrationBuilder.DropTable(
                name: "tag_used");

            migrationBuilder.DropTable(
                name: "tension_reading");

            migrationBuilder.DropTable(
                name: "thing_history");

            migrationBuilder.DropTable(
                name: "void");

            migrationBuilder.DropTable(
                name: "wood_path");

            migrationBuilder.DropTable(
                name: "batch_line");

            migrationBuilder.DropTable(
                name: "joint");

            migrationBuilder.DropTable(
                name: "queued_cut");

            migrationBuilder.DropTable(
                name: "hold");

            migrationBuilder.DropTable(
                name: "run");

            migrationBuilder.DropTable(
                name: "saw_setup");

            migrationBuilder.DropTable(
                name: "mount");

            migrationBuilder.DropTable(
                name: "batch");

            migrationBuilder.DropTable(
                name: "meter_reading");

            migrationBuilder.DropTable(
                name: "blade");

            migrationBuilder.DropTable(
                name: "meter_epoch");

            migrationBuilder.DropTable(
                name: "spec");

            migrationBuilder.DropTable(
                name: "entry");

            migrationBuilder.DropTable(
                name: "saw");

            migrationBuilder.DropTable(
                name: "person");
        }
    }
}

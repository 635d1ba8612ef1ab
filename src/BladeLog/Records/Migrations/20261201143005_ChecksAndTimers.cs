using Microsoft.EntityFrameworkCore.Migrations;

#nullable disable

namespace BladeLog.Records.Migrations
{
    /// <inheritdoc />
    public partial class ChecksAndTimers : Migration
    {
        /// <inheritdoc />
        protected override void Up(MigrationBuilder migrationBuilder)
        {
            migrationBuilder.AddColumn<string>(
                name: "looked_at",
                table: "inspection",
                type: "TEXT",
                nullable: true);

            migrationBuilder.AddColumn<string>(
                name: "marks",
                table: "inspection",
                type: "TEXT",
                nullable: true);

            migrationBuilder.CreateTable(
                name: "start_check",
                columns: table => new
                {
                    entry_id = table.Column<int>(type: "INTEGER", nullable: false),
                    saw_id = table.Column<int>(type: "INTEGER", nullable: false),
                    guards_right = table.Column<bool>(type: "INTEGER", nullable: false),
                    tension_right = table.Column<bool>(type: "INTEGER", nullable: true),
                    under_table_right = table.Column<bool>(type: "INTEGER", nullable: false),
                    quiet_right = table.Column<bool>(type: "INTEGER", nullable: true),
                    brake_right = table.Column<bool>(type: "INTEGER", nullable: false),
                    note = table.Column<string>(type: "TEXT", nullable: true)
                },
                constraints: table =>
                {
                    table.PrimaryKey("PK_start_check", x => x.entry_id);
                    table.ForeignKey(
                        name: "FK_start_check_entry_entry_id",
                        column: x => x.entry_id,
                        principalTable: "entry",
                        principalColumn: "id",
                        onDelete: ReferentialAction.Restrict);
                    table.ForeignKey(
                        name: "FK_start_check_saw_saw_id",
                        column: x => x.saw_id,
                        principalTable: "saw",
                        principalColumn: "id",
                        onDelete: ReferentialAction.Restrict);
                });

            migrationBuilder.CreateTable(
                name: "timer_started",
                columns: table => new
                {
                    entry_id = table.Column<int>(type: "INTEGER", nullable: false),
                    saw_id = table.Column<int>(type: "INTEGER", nullable: false),
                    speed_mps = table.Column<double>(type: "REAL", nullable: true)
                },
                constraints: table =>
                {
                    table.PrimaryKey("PK_timer_started", x => x.entry_id);
                    table.CheckConstraint("ck_timer_started_speed_mps", "\"speed_mps\" > 0 and \"speed_mps\" < 1e300");
                    table.ForeignKey(
                        name: "FK_timer_started_entry_entry_id",
                        column: x => x.entry_id,
                        principalTable: "entry",
                        principalColumn: "id",
                        onDelete: ReferentialAction.Restrict);
                    table.ForeignKey(
                        name: "FK_timer_started_saw_saw_id",
                        column: x => x.saw_id,
                        principalTable: "saw",
                        principalColumn: "id",
                        onDelete: ReferentialAction.Restrict);
                });

            // By hand: added through the builder, a reference or a check rebuilds its table, and the table loses its triggers.
            migrationBuilder.Sql("""
                ALTER TABLE "run" ADD COLUMN "timer_id" INTEGER NULL
                CONSTRAINT "FK_run_timer_started_timer_id" REFERENCES "timer_started" ("entry_id") ON DELETE RESTRICT;
                """);
            migrationBuilder.Sql("""
                ALTER TABLE "inspection" ADD COLUMN "teeth_missing" INTEGER NULL
                CONSTRAINT "ck_inspection_teeth_missing" CHECK ("teeth_missing" >= 0);
                """);

            migrationBuilder.CreateIndex(
                name: "IX_run_timer_id",
                table: "run",
                column: "timer_id");

            migrationBuilder.CreateIndex(
                name: "IX_start_check_saw_id",
                table: "start_check",
                column: "saw_id");

            migrationBuilder.CreateIndex(
                name: "IX_timer_started_saw_id",
                table: "timer_started",
                column: "saw_id");

            foreach (var table in new[] { "start_check", "timer_started" })
            {
                FirstTriggers.Refuse(migrationBuilder, table, "UPDATE", "a fact is written once: void it and enter it again");
                FirstTriggers.Refuse(migrationBuilder, table, "DELETE", "a fact is never deleted: void it");
            }
        }

        /// <inheritdoc />
        protected override void Down(MigrationBuilder migrationBuilder)
        {
            migrationBuilder.DropForeignKey(
                name: "FK_run_timer_started_timer_id",
                table: "run");

            migrationBuilder.DropTable(
                name: "start_check");

            migrationBuilder.DropTable(
                name: "timer_started");

            migrationBuilder.DropIndex(
                name: "IX_run_timer_id",
                table: "run");

            migrationBuilder.DropCheckConstraint(
                name: "ck_inspection_teeth_missing",
                table: "inspection");

            migrationBuilder.DropColumn(
                name: "timer_id",
                table: "run");

            migrationBuilder.DropColumn(
                name: "looked_at",
                table: "inspection");

            migrationBuilder.DropColumn(
                name: "marks",
                table: "inspection");

            migrationBuilder.DropColumn(
                name: "teeth_missing",
                table: "inspection");
        }
    }
}

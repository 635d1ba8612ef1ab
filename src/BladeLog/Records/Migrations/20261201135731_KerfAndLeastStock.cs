using Microsoft.EntityFrameworkCore.Migrations;

#nullable disable

namespace BladeLog.Records.Migrations
{
    /// <inheritdoc />
    public partial class KerfAndLeastStock : Migration
    {
        /// <inheritdoc />
        protected override void Up(MigrationBuilder migrationBuilder)
        {
            // With its check in one statement: a check added to a table that stands would rebuild it, and its triggers would be gone.
            migrationBuilder.Sql("""ALTER TABLE "spec" ADD COLUMN "least_stock" INTEGER NULL CONSTRAINT "ck_spec_least_stock" CHECK ("least_stock" >= 0)""");

            migrationBuilder.CreateTable(
                name: "kerf_reading",
                columns: table => new
                {
                    entry_id = table.Column<int>(type: "INTEGER", nullable: false),
                    blade_id = table.Column<int>(type: "INTEGER", nullable: false),
                    saw_id = table.Column<int>(type: "INTEGER", nullable: true),
                    how = table.Column<string>(type: "TEXT", nullable: false),
                    kerf_m = table.Column<double>(type: "REAL", nullable: true),
                    kerf_typed = table.Column<string>(type: "TEXT", nullable: true),
                    set_left_m = table.Column<double>(type: "REAL", nullable: true),
                    set_right_m = table.Column<double>(type: "REAL", nullable: true),
                    set_both_m = table.Column<double>(type: "REAL", nullable: true),
                    set_typed = table.Column<string>(type: "TEXT", nullable: true),
                    note = table.Column<string>(type: "TEXT", nullable: true)
                },
                constraints: table =>
                {
                    table.PrimaryKey("PK_kerf_reading", x => x.entry_id);
                    table.CheckConstraint("ck_kerf_reading_both_sides", "(set_left_m is null) = (set_right_m is null) and (set_left_m is null or set_both_m is not null)");
                    table.CheckConstraint("ck_kerf_reading_kerf_m", "\"kerf_m\" > 0 and \"kerf_m\" < 1e300");
                    table.CheckConstraint("ck_kerf_reading_says_something", "kerf_m is not null or set_both_m is not null");
                    table.CheckConstraint("ck_kerf_reading_set_both_m", "\"set_both_m\" > 0 and \"set_both_m\" < 1e300");
                    table.CheckConstraint("ck_kerf_reading_set_left_m", "\"set_left_m\" >= 0 and \"set_left_m\" < 1e300");
                    table.CheckConstraint("ck_kerf_reading_set_right_m", "\"set_right_m\" >= 0 and \"set_right_m\" < 1e300");
                    table.ForeignKey(
                        name: "FK_kerf_reading_blade_blade_id",
                        column: x => x.blade_id,
                        principalTable: "blade",
                        principalColumn: "id",
                        onDelete: ReferentialAction.Restrict);
                    table.ForeignKey(
                        name: "FK_kerf_reading_entry_entry_id",
                        column: x => x.entry_id,
                        principalTable: "entry",
                        principalColumn: "id",
                        onDelete: ReferentialAction.Restrict);
                    table.ForeignKey(
                        name: "FK_kerf_reading_saw_saw_id",
                        column: x => x.saw_id,
                        principalTable: "saw",
                        principalColumn: "id",
                        onDelete: ReferentialAction.Restrict);
                });

            migrationBuilder.CreateIndex(
                name: "IX_kerf_reading_blade_id",
                table: "kerf_reading",
                column: "blade_id");

            migrationBuilder.CreateIndex(
                name: "IX_kerf_reading_saw_id",
                table: "kerf_reading",
                column: "saw_id");

            FirstTriggers.Refuse(migrationBuilder, "kerf_reading", "UPDATE", "a fact is written once: void it and enter it again");
            FirstTriggers.Refuse(migrationBuilder, "kerf_reading", "DELETE", "a fact is never deleted: void it");
        }

        /// <inheritdoc />
        protected override void Down(MigrationBuilder migrationBuilder)
        {
            migrationBuilder.DropTable(
                name: "kerf_reading");

            migrationBuilder.Sql("""ALTER TABLE "spec" DROP COLUMN "least_stock";""");
        }
    }
}

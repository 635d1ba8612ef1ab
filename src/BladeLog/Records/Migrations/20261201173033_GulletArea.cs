using Microsoft.EntityFrameworkCore.Migrations;

#nullable disable

namespace BladeLog.Records.Migrations
{
    /// <inheritdoc />
    public partial class GulletArea : Migration
    {
        /// <inheritdoc />
        protected override void Up(MigrationBuilder migrationBuilder)
        {
            // With its check in one statement: a check added to a table that stands would rebuild it, and its triggers would be gone.
            migrationBuilder.Sql("""ALTER TABLE "spec" ADD COLUMN "gullet_area_m2" REAL NULL CONSTRAINT "ck_spec_gullet_area_m2" CHECK ("gullet_area_m2" > 0 and "gullet_area_m2" < 1e300)""");
        }

        /// <inheritdoc />
        protected override void Down(MigrationBuilder migrationBuilder)
        {
            migrationBuilder.Sql("""ALTER TABLE "spec" DROP COLUMN "gullet_area_m2";""");
        }
    }
}

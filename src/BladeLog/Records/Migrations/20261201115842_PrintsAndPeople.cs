using System;
using Microsoft.EntityFrameworkCore.Migrations;

#nullable disable

namespace BladeLog.Records.Migrations
{
    /// <inheritdoc />
    public partial class PrintsAndPeople : Migration
    {
        /// <inheritdoc />
        protected override void Up(MigrationBuilder migrationBuilder)
        {
            migrationBuilder.AddColumn<string>(
                name: "lan_name",
                table: "shop",
                type: "TEXT",
                nullable: true);

            migrationBuilder.AddColumn<int>(
                name: "trained_id",
                table: "person_role",
                type: "INTEGER",
                nullable: true);

            migrationBuilder.CreateTable(
                name: "hand_over",
                columns: table => new
                {
                    entry_id = table.Column<int>(type: "INTEGER", nullable: false),
                    text = table.Column<string>(type: "TEXT", nullable: false)
                },
                constraints: table =>
                {
                    table.PrimaryKey("PK_hand_over", x => x.entry_id);
                    table.CheckConstraint("ck_hand_over_text", "length(text) between 1 and 4000");
                    table.ForeignKey(
                        name: "FK_hand_over_entry_entry_id",
                        column: x => x.entry_id,
                        principalTable: "entry",
                        principalColumn: "id",
                        onDelete: ReferentialAction.Restrict);
                });

            migrationBuilder.CreateTable(
                name: "label_printed",
                columns: table => new
                {
                    entry_id = table.Column<int>(type: "INTEGER", nullable: false),
                    blade_id = table.Column<int>(type: "INTEGER", nullable: false),
                    tag = table.Column<string>(type: "TEXT", nullable: false)
                },
                constraints: table =>
                {
                    table.PrimaryKey("PK_label_printed", x => x.entry_id);
                    table.ForeignKey(
                        name: "FK_label_printed_blade_blade_id",
                        column: x => x.blade_id,
                        principalTable: "blade",
                        principalColumn: "id",
                        onDelete: ReferentialAction.Restrict);
                    table.ForeignKey(
                        name: "FK_label_printed_entry_entry_id",
                        column: x => x.entry_id,
                        principalTable: "entry",
                        principalColumn: "id",
                        onDelete: ReferentialAction.Restrict);
                });

            migrationBuilder.CreateTable(
                name: "trained",
                columns: table => new
                {
                    entry_id = table.Column<int>(type: "INTEGER", nullable: false),
                    person_id = table.Column<int>(type: "INTEGER", nullable: false),
                    saw_id = table.Column<int>(type: "INTEGER", nullable: true),
                    task = table.Column<string>(type: "TEXT", nullable: false),
                    by_id = table.Column<int>(type: "INTEGER", nullable: false),
                    refresher_utc = table.Column<DateTime>(type: "TEXT", nullable: true)
                },
                constraints: table =>
                {
                    table.PrimaryKey("PK_trained", x => x.entry_id);
                    table.ForeignKey(
                        name: "FK_trained_entry_entry_id",
                        column: x => x.entry_id,
                        principalTable: "entry",
                        principalColumn: "id",
                        onDelete: ReferentialAction.Restrict);
                    table.ForeignKey(
                        name: "FK_trained_person_by_id",
                        column: x => x.by_id,
                        principalTable: "person",
                        principalColumn: "id",
                        onDelete: ReferentialAction.Restrict);
                    table.ForeignKey(
                        name: "FK_trained_person_person_id",
                        column: x => x.person_id,
                        principalTable: "person",
                        principalColumn: "id",
                        onDelete: ReferentialAction.Restrict);
                    table.ForeignKey(
                        name: "FK_trained_saw_saw_id",
                        column: x => x.saw_id,
                        principalTable: "saw",
                        principalColumn: "id",
                        onDelete: ReferentialAction.Restrict);
                });

            migrationBuilder.CreateTable(
                name: "hand_over_read",
                columns: table => new
                {
                    entry_id = table.Column<int>(type: "INTEGER", nullable: false),
                    hand_over_id = table.Column<int>(type: "INTEGER", nullable: false)
                },
                constraints: table =>
                {
                    table.PrimaryKey("PK_hand_over_read", x => x.entry_id);
                    table.ForeignKey(
                        name: "FK_hand_over_read_entry_entry_id",
                        column: x => x.entry_id,
                        principalTable: "entry",
                        principalColumn: "id",
                        onDelete: ReferentialAction.Restrict);
                    table.ForeignKey(
                        name: "FK_hand_over_read_hand_over_hand_over_id",
                        column: x => x.hand_over_id,
                        principalTable: "hand_over",
                        principalColumn: "entry_id",
                        onDelete: ReferentialAction.Restrict);
                });

            migrationBuilder.CreateIndex(
                name: "IX_hand_over_read_hand_over_id",
                table: "hand_over_read",
                column: "hand_over_id");

            migrationBuilder.CreateIndex(
                name: "IX_label_printed_blade_id",
                table: "label_printed",
                column: "blade_id");

            migrationBuilder.CreateIndex(
                name: "IX_trained_by_id",
                table: "trained",
                column: "by_id");

            migrationBuilder.CreateIndex(
                name: "IX_trained_person_id",
                table: "trained",
                column: "person_id");

            migrationBuilder.CreateIndex(
                name: "IX_trained_saw_id",
                table: "trained",
                column: "saw_id");

            foreach (var table in new[] { "hand_over", "hand_over_read", "trained", "label_printed" })
            {
                FirstTriggers.Refuse(migrationBuilder, table, "UPDATE", "a fact is written once: void it and enter it again");
                FirstTriggers.Refuse(migrationBuilder, table, "DELETE", "a fact is never deleted: void it");
            }
        }

        /// <inheritdoc />
        protected override void Down(MigrationBuilder migrationBuilder)
        {
            migrationBuilder.DropTable(
                name: "hand_over_read");

            migrationBuilder.DropTable(
                name: "label_printed");

            migrationBuilder.DropTable(
                name: "trained");

            migrationBuilder.DropTable(
                name: "hand_over");

            migrationBuilder.DropColumn(
                name: "lan_name",
                table: "shop");

            migrationBuilder.DropColumn(
                name: "trained_id",
                table: "person_role");
        }
    }
}

using System;
using Microsoft.EntityFrameworkCore.Migrations;
using NodaTime;

#nullable disable

namespace UnitVent.Store.Schema.Migrations
{
    /// <inheritdoc />
    public partial class Thresholds : Migration
    {
        /// <inheritdoc />
        protected override void Up(MigrationBuilder migrationBuilder)
        {
            migrationBuilder.CreateTable(
                name: "threshold_version",
                columns: table => new
                {
                    unit_id = table.Column<Guid>(type: "uuid", nullable: false),
                    id = table.Column<Guid>(type: "uuid", nullable: false),
                    at = table.Column<Instant>(type: "timestamp with time zone", nullable: false),
                    by = table.Column<string>(type: "text", nullable: false),
                    by_id = table.Column<Guid>(type: "uuid", nullable: true),
                    reason = table.Column<string>(type: "text", nullable: false),
                    chosen = table.Column<string>(type: "jsonb", nullable: false),
                    needs_second = table.Column<bool>(type: "boolean", nullable: false)
                },
                constraints: table =>
                {
                    table.PrimaryKey("pk_threshold_version", x => new { x.unit_id, x.id });
                    table.ForeignKey(
                        name: "fk_threshold_version_units_unit_id",
                        column: x => x.unit_id,
                        principalTable: "unit",
                        principalColumn: "id",
                        onDelete: ReferentialAction.Restrict);
                });

            migrationBuilder.CreateTable(
                name: "threshold_answer",
                columns: table => new
                {
                    unit_id = table.Column<Guid>(type: "uuid", nullable: false),
                    version_id = table.Column<Guid>(type: "uuid", nullable: false),
                    at = table.Column<Instant>(type: "timestamp with time zone", nullable: false),
                    by = table.Column<string>(type: "text", nullable: false),
                    by_id = table.Column<Guid>(type: "uuid", nullable: true),
                    agrees = table.Column<bool>(type: "boolean", nullable: false)
                },
                constraints: table =>
                {
                    table.PrimaryKey("pk_threshold_answer", x => new { x.unit_id, x.version_id });
                    table.ForeignKey(
                        name: "fk_threshold_answer_threshold_version_unit_id_version_id",
                        columns: x => new { x.unit_id, x.version_id },
                        principalTable: "threshold_version",
                        principalColumns: new[] { "unit_id", "id" },
                        onDelete: ReferentialAction.Restrict);
                });

            migrationBuilder.CreateIndex(
                name: "ix_threshold_version_unit_id_at",
                table: "threshold_version",
                columns: new[] { "unit_id", "at" });

            migrationBuilder.Sql(SchemaSql.Protect("threshold_version"));
            migrationBuilder.Sql(SchemaSql.Protect("threshold_answer"));
        }

        /// <inheritdoc />
        protected override void Down(MigrationBuilder migrationBuilder)
        {
            migrationBuilder.DropTable(
                name: "threshold_answer");

            migrationBuilder.DropTable(
                name: "threshold_version");
        }
    }
}

using System;
using Microsoft.EntityFrameworkCore.Migrations;

#nullable disable

namespace HfClinic.Migrations.PostgreSql.Migrations
{
    /// <inheritdoc />
    public partial class ImportStates : Migration
    {
        /// <inheritdoc />
        protected override void Up(MigrationBuilder migrationBuilder)
        {
            migrationBuilder.AddColumn<DateTime>(
                name: "HeartbeatAt",
                table: "ImportRuns",
                type: "timestamp with time zone",
                nullable: false,
                defaultValue: new DateTime(1, 1, 1, 0, 0, 0, 0, DateTimeKind.Unspecified));

            migrationBuilder.AddColumn<int>(
                name: "Later",
                table: "ImportRuns",
                type: "integer",
                nullable: false,
                defaultValue: 0);

            migrationBuilder.AddColumn<int>(
                name: "State",
                table: "ImportRuns",
                type: "integer",
                nullable: false,
                defaultValue: 0);

            migrationBuilder.CreateIndex(
                name: "IX_ImportRuns_State",
                table: "ImportRuns",
                column: "State",
                filter: "\"State\" = 1");

            migrationBuilder.AddCheckConstraint(
                name: "CK_ImportRuns_State",
                table: "ImportRuns",
                sql: "\"State\" BETWEEN 1 AND 4");
        }

        /// <inheritdoc />
        protected override void Down(MigrationBuilder migrationBuilder)
        {
            migrationBuilder.DropIndex(
                name: "IX_ImportRuns_State",
                table: "ImportRuns");

            migrationBuilder.DropCheckConstraint(
                name: "CK_ImportRuns_State",
                table: "ImportRuns");

            migrationBuilder.DropColumn(
                name: "HeartbeatAt",
                table: "ImportRuns");

            migrationBuilder.DropColumn(
                name: "Later",
                table: "ImportRuns");

            migrationBuilder.DropColumn(
                name: "State",
                table: "ImportRuns");
        }
    }
}

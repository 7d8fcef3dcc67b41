using System;
using Microsoft.EntityFrameworkCore.Migrations;

#nullable disable

namespace Selector.Storage.Sqlite.Migrations
{
    /// <inheritdoc />
    public partial class Initial : Migration
    {
        /// <inheritdoc />
        protected override void Up(MigrationBuilder migrationBuilder)
        {
            migrationBuilder.CreateTable(
                name: "catalogue_version",
                columns: table => new
                {
                    Id = table.Column<int>(type: "INTEGER", nullable: false),
                    ChangedUtc = table.Column<DateTime>(type: "TEXT", nullable: false),
                    Version = table.Column<long>(type: "INTEGER", nullable: false)
                },
                constraints: table =>
                {
                    table.PrimaryKey("PK_catalogue_version", x => x.Id);
                });

            migrationBuilder.CreateTable(
                name: "part",
                columns: table => new
                {
                    Id = table.Column<int>(type: "INTEGER", nullable: false)
                        .Annotation("Sqlite:Autoincrement", true),
                    Family = table.Column<string>(type: "TEXT", maxLength: 60, nullable: false),
                    Maker = table.Column<string>(type: "TEXT", maxLength: 400, nullable: false),
                    OrderingCode = table.Column<string>(type: "TEXT", maxLength: 400, nullable: false),
                    ShopNumber = table.Column<string>(type: "TEXT", maxLength: 400, nullable: false),
                    Technology = table.Column<string>(type: "TEXT", maxLength: 60, nullable: false),
                    Package = table.Column<string>(type: "TEXT", maxLength: 400, nullable: false),
                    Lifecycle = table.Column<string>(type: "TEXT", maxLength: 60, nullable: false),
                    Stock = table.Column<int>(type: "INTEGER", nullable: false),
                    LeastOrder = table.Column<int>(type: "INTEGER", nullable: false),
                    Multiple = table.Column<int>(type: "INTEGER", nullable: false),
                    Ratings = table.Column<string>(type: "TEXT", nullable: false),
                    Prices = table.Column<string>(type: "TEXT", nullable: false),
                    Source = table.Column<string>(type: "TEXT", maxLength: 400, nullable: false),
                    Search = table.Column<string>(type: "TEXT", nullable: false),
                    Version = table.Column<long>(type: "INTEGER", nullable: false)
                },
                constraints: table =>
                {
                    table.PrimaryKey("PK_part", x => x.Id);
                });

            migrationBuilder.CreateTable(
                name: "supply",
                columns: table => new
                {
                    Number = table.Column<int>(type: "INTEGER", nullable: false)
                        .Annotation("Sqlite:Autoincrement", true),
                    Name = table.Column<string>(type: "TEXT", maxLength: 120, nullable: false),
                    CreatedUtc = table.Column<DateTime>(type: "TEXT", nullable: false),
                    EditedUtc = table.Column<DateTime>(type: "TEXT", nullable: false),
                    LastSequence = table.Column<int>(type: "INTEGER", nullable: false),
                    UndoTop = table.Column<int>(type: "INTEGER", nullable: false),
                    RedoTop = table.Column<int>(type: "INTEGER", nullable: false),
                    Version = table.Column<long>(type: "INTEGER", nullable: false)
                },
                constraints: table =>
                {
                    table.PrimaryKey("PK_supply", x => x.Number);
                });

            migrationBuilder.CreateTable(
                name: "supply_edit",
                columns: table => new
                {
                    Supply = table.Column<int>(type: "INTEGER", nullable: false),
                    Sequence = table.Column<int>(type: "INTEGER", nullable: false),
                    Field = table.Column<string>(type: "TEXT", maxLength: 100, nullable: false),
                    Old = table.Column<string>(type: "TEXT", maxLength: 4096, nullable: false),
                    New = table.Column<string>(type: "TEXT", maxLength: 4096, nullable: false),
                    By = table.Column<string>(type: "TEXT", maxLength: 120, nullable: false),
                    AtUtc = table.Column<DateTime>(type: "TEXT", nullable: false),
                    Undoes = table.Column<int>(type: "INTEGER", nullable: true),
                    Below = table.Column<int>(type: "INTEGER", nullable: false)
                },
                constraints: table =>
                {
                    table.PrimaryKey("PK_supply_edit", x => new { x.Supply, x.Sequence });
                    table.ForeignKey(
                        name: "FK_supply_edit_supply_Supply",
                        column: x => x.Supply,
                        principalTable: "supply",
                        principalColumn: "Number",
                        onDelete: ReferentialAction.Cascade);
                });

            migrationBuilder.CreateTable(
                name: "supply_text",
                columns: table => new
                {
                    Supply = table.Column<int>(type: "INTEGER", nullable: false),
                    Field = table.Column<string>(type: "TEXT", maxLength: 100, nullable: false),
                    Text = table.Column<string>(type: "TEXT", maxLength: 4096, nullable: false),
                    Sequence = table.Column<int>(type: "INTEGER", nullable: false)
                },
                constraints: table =>
                {
                    table.PrimaryKey("PK_supply_text", x => new { x.Supply, x.Field });
                    table.ForeignKey(
                        name: "FK_supply_text_supply_Supply",
                        column: x => x.Supply,
                        principalTable: "supply",
                        principalColumn: "Number",
                        onDelete: ReferentialAction.Cascade);
                });

            migrationBuilder.InsertData(
                table: "catalogue_version",
                columns: new[] { "Id", "ChangedUtc", "Version" },
                values: new object[] { 1, new DateTime(1970, 1, 1, 0, 0, 0, 0, DateTimeKind.Utc), 0L });

            migrationBuilder.CreateIndex(
                name: "IX_part_Family_Maker_OrderingCode",
                table: "part",
                columns: new[] { "Family", "Maker", "OrderingCode" },
                unique: true);

            migrationBuilder.CreateIndex(
                name: "IX_part_Search",
                table: "part",
                column: "Search");

            migrationBuilder.CreateIndex(
                name: "IX_supply_EditedUtc",
                table: "supply",
                column: "EditedUtc");
        }

        /// <inheritdoc />
        protected override void Down(MigrationBuilder migrationBuilder)
        {
            migrationBuilder.DropTable(
                name: "catalogue_version");

            migrationBuilder.DropTable(
                name: "part");

            migrationBuilder.DropTable(
                name: "supply_edit");

            migrationBuilder.DropTable(
                name: "supply_text");

            migrationBuilder.DropTable(
                name: "supply");
        }
    }
}

using System;
using Microsoft.EntityFrameworkCore.Migrations;

#nullable disable

#pragma warning disable CA1814 // Prefer jagged arrays over multidimensional

namespace HfClinic.Migrations.Sqlite.Migrations
{
    /// <inheritdoc />
    public partial class Initial : Migration
    {
        /// <inheritdoc />
        protected override void Up(MigrationBuilder migrationBuilder)
        {
            migrationBuilder.CreateTable(
                name: "AspNetRoles",
                columns: table => new
                {
                    Id = table.Column<Guid>(type: "TEXT", nullable: false),
                    Name = table.Column<string>(type: "TEXT", maxLength: 256, nullable: true),
                    NormalizedName = table.Column<string>(type: "TEXT", maxLength: 256, nullable: true),
                    ConcurrencyStamp = table.Column<string>(type: "TEXT", nullable: true)
                },
                constraints: table =>
                {
                    table.PrimaryKey("PK_AspNetRoles", x => x.Id);
                });

            migrationBuilder.CreateTable(
                name: "AspNetUsers",
                columns: table => new
                {
                    Id = table.Column<Guid>(type: "TEXT", nullable: false),
                    DisplayName = table.Column<string>(type: "TEXT", maxLength: 80, nullable: false),
                    IsActive = table.Column<bool>(type: "INTEGER", nullable: false),
                    UserName = table.Column<string>(type: "TEXT", maxLength: 256, nullable: true),
                    NormalizedUserName = table.Column<string>(type: "TEXT", maxLength: 256, nullable: true),
                    Email = table.Column<string>(type: "TEXT", maxLength: 256, nullable: true),
                    NormalizedEmail = table.Column<string>(type: "TEXT", maxLength: 256, nullable: true),
                    EmailConfirmed = table.Column<bool>(type: "INTEGER", nullable: false),
                    PasswordHash = table.Column<string>(type: "TEXT", nullable: true),
                    SecurityStamp = table.Column<string>(type: "TEXT", nullable: true),
                    ConcurrencyStamp = table.Column<string>(type: "TEXT", nullable: true),
                    PhoneNumber = table.Column<string>(type: "TEXT", nullable: true),
                    PhoneNumberConfirmed = table.Column<bool>(type: "INTEGER", nullable: false),
                    TwoFactorEnabled = table.Column<bool>(type: "INTEGER", nullable: false),
                    LockoutEnd = table.Column<DateTime>(type: "TEXT", nullable: true),
                    LockoutEnabled = table.Column<bool>(type: "INTEGER", nullable: false),
                    AccessFailedCount = table.Column<int>(type: "INTEGER", nullable: false)
                },
                constraints: table =>
                {
                    table.PrimaryKey("PK_AspNetUsers", x => x.Id);
                });

            migrationBuilder.CreateTable(
                name: "AuditEntries",
                columns: table => new
                {
                    Id = table.Column<long>(type: "INTEGER", nullable: false),
                    At = table.Column<DateTime>(type: "TEXT", nullable: false),
                    ById = table.Column<Guid>(type: "TEXT", nullable: true),
                    ByName = table.Column<string>(type: "TEXT", maxLength: 100, nullable: false),
                    PatientId = table.Column<long>(type: "INTEGER", nullable: true),
                    What = table.Column<string>(type: "TEXT", maxLength: 200, nullable: false),
                    Before = table.Column<string>(type: "TEXT", nullable: true),
                    After = table.Column<string>(type: "TEXT", nullable: true),
                    Hash = table.Column<string>(type: "TEXT", maxLength: 64, nullable: false)
                },
                constraints: table =>
                {
                    table.PrimaryKey("PK_AuditEntries", x => x.Id);
                });

            migrationBuilder.CreateTable(
                name: "AuditHeads",
                columns: table => new
                {
                    Id = table.Column<int>(type: "INTEGER", nullable: false),
                    LastId = table.Column<long>(type: "INTEGER", nullable: false),
                    LastHash = table.Column<string>(type: "TEXT", maxLength: 64, nullable: false)
                },
                constraints: table =>
                {
                    table.PrimaryKey("PK_AuditHeads", x => x.Id);
                });

            migrationBuilder.CreateTable(
                name: "DataProtectionKeys",
                columns: table => new
                {
                    Id = table.Column<int>(type: "INTEGER", nullable: false)
                        .Annotation("Sqlite:Autoincrement", true),
                    FriendlyName = table.Column<string>(type: "TEXT", nullable: true),
                    Xml = table.Column<string>(type: "TEXT", nullable: true)
                },
                constraints: table =>
                {
                    table.PrimaryKey("PK_DataProtectionKeys", x => x.Id);
                });

            migrationBuilder.CreateTable(
                name: "ImportRuns",
                columns: table => new
                {
                    Id = table.Column<long>(type: "INTEGER", nullable: false)
                        .Annotation("Sqlite:Autoincrement", true),
                    Kind = table.Column<int>(type: "INTEGER", nullable: false),
                    FileName = table.Column<string>(type: "TEXT", maxLength: 260, nullable: false),
                    StartedAt = table.Column<DateTime>(type: "TEXT", nullable: false),
                    FinishedAt = table.Column<DateTime>(type: "TEXT", nullable: true),
                    State = table.Column<int>(type: "INTEGER", nullable: false),
                    HeartbeatAt = table.Column<DateTime>(type: "TEXT", nullable: false),
                    ById = table.Column<Guid>(type: "TEXT", nullable: true),
                    ByName = table.Column<string>(type: "TEXT", maxLength: 100, nullable: false),
                    Lines = table.Column<int>(type: "INTEGER", nullable: false),
                    Accepted = table.Column<int>(type: "INTEGER", nullable: false),
                    Later = table.Column<int>(type: "INTEGER", nullable: false),
                    Duplicates = table.Column<int>(type: "INTEGER", nullable: false),
                    Held = table.Column<int>(type: "INTEGER", nullable: false),
                    Refused = table.Column<int>(type: "INTEGER", nullable: false)
                },
                constraints: table =>
                {
                    table.PrimaryKey("PK_ImportRuns", x => x.Id);
                    table.CheckConstraint("CK_ImportRuns_State", "\"State\" BETWEEN 1 AND 4");
                });

            migrationBuilder.CreateTable(
                name: "Patients",
                columns: table => new
                {
                    Id = table.Column<long>(type: "INTEGER", nullable: false)
                        .Annotation("Sqlite:Autoincrement", true),
                    ClinicNumber = table.Column<string>(type: "TEXT", maxLength: 20, nullable: false),
                    FamilyName = table.Column<string>(type: "TEXT", maxLength: 80, nullable: false),
                    GivenName = table.Column<string>(type: "TEXT", maxLength: 80, nullable: false),
                    SearchText = table.Column<string>(type: "TEXT", maxLength: 400, nullable: false),
                    BirthDate = table.Column<DateOnly>(type: "TEXT", nullable: true),
                    Sex = table.Column<int>(type: "INTEGER", nullable: false),
                    HeightCentimetres = table.Column<int>(type: "INTEGER", nullable: true),
                    Phone = table.Column<string>(type: "TEXT", maxLength: 40, nullable: true),
                    EnrolledOn = table.Column<DateOnly>(type: "TEXT", nullable: false),
                    LeftOn = table.Column<DateOnly>(type: "TEXT", nullable: true),
                    LeftBecause = table.Column<string>(type: "TEXT", maxLength: 400, nullable: true),
                    WeighsAtHome = table.Column<bool>(type: "INTEGER", nullable: false),
                    DischargedFromHospitalOn = table.Column<DateOnly>(type: "TEXT", nullable: true),
                    NurseId = table.Column<Guid>(type: "TEXT", nullable: true),
                    Household = table.Column<string>(type: "TEXT", maxLength: 40, nullable: true),
                    Note = table.Column<string>(type: "TEXT", maxLength: 2000, nullable: true),
                    Version = table.Column<int>(type: "INTEGER", nullable: false)
                },
                constraints: table =>
                {
                    table.PrimaryKey("PK_Patients", x => x.Id);
                    table.CheckConstraint("CK_Patients_ClinicNumber", "\"ClinicNumber\" <> ''");
                    table.CheckConstraint("CK_Patients_Height", "\"HeightCentimetres\" IS NULL OR \"HeightCentimetres\" BETWEEN 100 AND 230");
                    table.CheckConstraint("CK_Patients_Left", "\"LeftOn\" IS NULL OR \"LeftOn\" >= \"EnrolledOn\"");
                });

            migrationBuilder.CreateTable(
                name: "Settings",
                columns: table => new
                {
                    Id = table.Column<int>(type: "INTEGER", nullable: false),
                    ClinicName = table.Column<string>(type: "TEXT", maxLength: 100, nullable: false),
                    TimeZone = table.Column<string>(type: "TEXT", maxLength: 60, nullable: false),
                    WeightUnit = table.Column<int>(type: "INTEGER", nullable: false),
                    IsDemo = table.Column<bool>(type: "INTEGER", nullable: false),
                    Version = table.Column<int>(type: "INTEGER", nullable: false)
                },
                constraints: table =>
                {
                    table.PrimaryKey("PK_Settings", x => x.Id);
                    table.CheckConstraint("CK_Settings_OneRow", "\"Id\" = 1");
                });

            migrationBuilder.CreateTable(
                name: "SweepRuns",
                columns: table => new
                {
                    Day = table.Column<DateOnly>(type: "TEXT", nullable: false),
                    HeldAt = table.Column<DateTime>(type: "TEXT", nullable: false),
                    HeldBy = table.Column<Guid>(type: "TEXT", nullable: false),
                    FinishedAt = table.Column<DateTime>(type: "TEXT", nullable: true),
                    LastPatientId = table.Column<long>(type: "INTEGER", nullable: false),
                    Patients = table.Column<int>(type: "INTEGER", nullable: false),
                    Failed = table.Column<int>(type: "INTEGER", nullable: false)
                },
                constraints: table =>
                {
                    table.PrimaryKey("PK_SweepRuns", x => x.Day);
                });

            migrationBuilder.CreateTable(
                name: "AspNetRoleClaims",
                columns: table => new
                {
                    Id = table.Column<int>(type: "INTEGER", nullable: false)
                        .Annotation("Sqlite:Autoincrement", true),
                    RoleId = table.Column<Guid>(type: "TEXT", nullable: false),
                    ClaimType = table.Column<string>(type: "TEXT", nullable: true),
                    ClaimValue = table.Column<string>(type: "TEXT", nullable: true)
                },
                constraints: table =>
                {
                    table.PrimaryKey("PK_AspNetRoleClaims", x => x.Id);
                    table.ForeignKey(
                        name: "FK_AspNetRoleClaims_AspNetRoles_RoleId",
                        column: x => x.RoleId,
                        principalTable: "AspNetRoles",
                        principalColumn: "Id",
                        onDelete: ReferentialAction.Cascade);
                });

            migrationBuilder.CreateTable(
                name: "AspNetUserClaims",
                columns: table => new
                {
                    Id = table.Column<int>(type: "INTEGER", nullable: false)
                        .Annotation("Sqlite:Autoincrement", true),
                    UserId = table.Column<Guid>(type: "TEXT", nullable: false),
                    ClaimType = table.Column<string>(type: "TEXT", nullable: true),
                    ClaimValue = table.Column<string>(type: "TEXT", nullable: true)
                },
                constraints: table =>
                {
                    table.PrimaryKey("PK_AspNetUserClaims", x => x.Id);
                    table.ForeignKey(
                        name: "FK_AspNetUserClaims_AspNetUsers_UserId",
                        column: x => x.UserId,
                        principalTable: "AspNetUsers",
                        principalColumn: "Id",
                        onDelete: ReferentialAction.Cascade);
                });

            migrationBuilder.CreateTable(
                name: "AspNetUserLogins",
                columns: table => new
                {
                    LoginProvider = table.Column<string>(type: "TEXT", nullable: false),
                    ProviderKey = table.Column<string>(type: "TEXT", nullable: false),
                    ProviderDisplayName = table.Column<string>(type: "TEXT", nullable: true),
                    UserId = table.Column<Guid>(type: "TEXT", nullable: false)
                },
                constraints: table =>
                {
                    table.PrimaryKey("PK_AspNetUserLogins", x => new { x.LoginProvider, x.ProviderKey });
                    table.ForeignKey(
                        name: "FK_AspNetUserLogins_AspNetUsers_UserId",
                        column: x => x.UserId,
                        principalTable: "AspNetUsers",
                        principalColumn: "Id",
                        onDelete: ReferentialAction.Cascade);
                });

            migrationBuilder.CreateTable(
                name: "AspNetUserRoles",
                columns: table => new
                {
                    UserId = table.Column<Guid>(type: "TEXT", nullable: false),
                    RoleId = table.Column<Guid>(type: "TEXT", nullable: false)
                },
                constraints: table =>
                {
                    table.PrimaryKey("PK_AspNetUserRoles", x => new { x.UserId, x.RoleId });
                    table.ForeignKey(
                        name: "FK_AspNetUserRoles_AspNetRoles_RoleId",
                        column: x => x.RoleId,
                        principalTable: "AspNetRoles",
                        principalColumn: "Id",
                        onDelete: ReferentialAction.Cascade);
                    table.ForeignKey(
                        name: "FK_AspNetUserRoles_AspNetUsers_UserId",
                        column: x => x.UserId,
                        principalTable: "AspNetUsers",
                        principalColumn: "Id",
                        onDelete: ReferentialAction.Cascade);
                });

            migrationBuilder.CreateTable(
                name: "AspNetUserTokens",
                columns: table => new
                {
                    UserId = table.Column<Guid>(type: "TEXT", nullable: false),
                    LoginProvider = table.Column<string>(type: "TEXT", nullable: false),
                    Name = table.Column<string>(type: "TEXT", nullable: false),
                    Value = table.Column<string>(type: "TEXT", nullable: true)
                },
                constraints: table =>
                {
                    table.PrimaryKey("PK_AspNetUserTokens", x => new { x.UserId, x.LoginProvider, x.Name });
                    table.ForeignKey(
                        name: "FK_AspNetUserTokens_AspNetUsers_UserId",
                        column: x => x.UserId,
                        principalTable: "AspNetUsers",
                        principalColumn: "Id",
                        onDelete: ReferentialAction.Cascade);
                });

            migrationBuilder.CreateTable(
                name: "ImportLines",
                columns: table => new
                {
                    Id = table.Column<long>(type: "INTEGER", nullable: false)
                        .Annotation("Sqlite:Autoincrement", true),
                    ImportId = table.Column<long>(type: "INTEGER", nullable: false),
                    LineNumber = table.Column<int>(type: "INTEGER", nullable: false),
                    Outcome = table.Column<int>(type: "INTEGER", nullable: false),
                    Reason = table.Column<string>(type: "TEXT", maxLength: 200, nullable: false),
                    Mend = table.Column<string>(type: "TEXT", maxLength: 400, nullable: false),
                    Text = table.Column<string>(type: "TEXT", maxLength: 400, nullable: false)
                },
                constraints: table =>
                {
                    table.PrimaryKey("PK_ImportLines", x => x.Id);
                    table.ForeignKey(
                        name: "FK_ImportLines_ImportRuns_ImportId",
                        column: x => x.ImportId,
                        principalTable: "ImportRuns",
                        principalColumn: "Id",
                        onDelete: ReferentialAction.Cascade);
                });

            migrationBuilder.CreateTable(
                name: "BloodTests",
                columns: table => new
                {
                    Id = table.Column<long>(type: "INTEGER", nullable: false)
                        .Annotation("Sqlite:Autoincrement", true),
                    PatientId = table.Column<long>(type: "INTEGER", nullable: false),
                    Analyte = table.Column<string>(type: "TEXT", maxLength: 40, nullable: false),
                    TakenAt = table.Column<DateTime>(type: "TEXT", nullable: false),
                    Day = table.Column<DateOnly>(type: "TEXT", nullable: false),
                    Value = table.Column<decimal>(type: "TEXT", precision: 14, scale: 4, nullable: false),
                    AsReported = table.Column<string>(type: "TEXT", maxLength: 40, nullable: false),
                    UnitAsReported = table.Column<string>(type: "TEXT", maxLength: 20, nullable: false),
                    RecordedAt = table.Column<DateTime>(type: "TEXT", nullable: false),
                    ById = table.Column<Guid>(type: "TEXT", nullable: true),
                    ByName = table.Column<string>(type: "TEXT", maxLength: 100, nullable: false),
                    StruckOutAt = table.Column<DateTime>(type: "TEXT", nullable: true),
                    StruckOutBecause = table.Column<string>(type: "TEXT", maxLength: 400, nullable: true)
                },
                constraints: table =>
                {
                    table.PrimaryKey("PK_BloodTests", x => x.Id);
                    table.ForeignKey(
                        name: "FK_BloodTests_Patients_PatientId",
                        column: x => x.PatientId,
                        principalTable: "Patients",
                        principalColumn: "Id",
                        onDelete: ReferentialAction.Restrict);
                });

            migrationBuilder.CreateTable(
                name: "Contacts",
                columns: table => new
                {
                    Id = table.Column<long>(type: "INTEGER", nullable: false)
                        .Annotation("Sqlite:Autoincrement", true),
                    PatientId = table.Column<long>(type: "INTEGER", nullable: false),
                    At = table.Column<DateTime>(type: "TEXT", nullable: false),
                    Day = table.Column<DateOnly>(type: "TEXT", nullable: false),
                    Outcome = table.Column<int>(type: "INTEGER", nullable: false),
                    Note = table.Column<string>(type: "TEXT", maxLength: 2000, nullable: true),
                    ById = table.Column<Guid>(type: "TEXT", nullable: true),
                    ByName = table.Column<string>(type: "TEXT", maxLength: 100, nullable: false)
                },
                constraints: table =>
                {
                    table.PrimaryKey("PK_Contacts", x => x.Id);
                    table.ForeignKey(
                        name: "FK_Contacts_Patients_PatientId",
                        column: x => x.PatientId,
                        principalTable: "Patients",
                        principalColumn: "Id",
                        onDelete: ReferentialAction.Restrict);
                });

            migrationBuilder.CreateTable(
                name: "DoseCourses",
                columns: table => new
                {
                    Id = table.Column<long>(type: "INTEGER", nullable: false)
                        .Annotation("Sqlite:Autoincrement", true),
                    PatientId = table.Column<long>(type: "INTEGER", nullable: false),
                    Medicine = table.Column<string>(type: "TEXT", maxLength: 80, nullable: false),
                    DoseMilligrams = table.Column<decimal>(type: "TEXT", precision: 10, scale: 4, nullable: false),
                    TimesDaily = table.Column<decimal>(type: "TEXT", precision: 5, scale: 3, nullable: false),
                    From = table.Column<DateOnly>(type: "TEXT", nullable: false),
                    Until = table.Column<DateOnly>(type: "TEXT", nullable: true),
                    Reason = table.Column<string>(type: "TEXT", maxLength: 400, nullable: true),
                    EndedBecause = table.Column<string>(type: "TEXT", maxLength: 400, nullable: true),
                    RecordedAt = table.Column<DateTime>(type: "TEXT", nullable: false),
                    ById = table.Column<Guid>(type: "TEXT", nullable: true),
                    ByName = table.Column<string>(type: "TEXT", maxLength: 100, nullable: false),
                    StruckOutAt = table.Column<DateTime>(type: "TEXT", nullable: true),
                    StruckOutBecause = table.Column<string>(type: "TEXT", maxLength: 400, nullable: true)
                },
                constraints: table =>
                {
                    table.PrimaryKey("PK_DoseCourses", x => x.Id);
                    table.CheckConstraint("CK_DoseCourses_Dates", "\"Until\" IS NULL OR \"Until\" >= \"From\"");
                    table.CheckConstraint("CK_DoseCourses_Medicine", "\"Medicine\" <> ''");
                    table.ForeignKey(
                        name: "FK_DoseCourses_Patients_PatientId",
                        column: x => x.PatientId,
                        principalTable: "Patients",
                        principalColumn: "Id",
                        onDelete: ReferentialAction.Restrict);
                });

            migrationBuilder.CreateTable(
                name: "EjectionFractions",
                columns: table => new
                {
                    Id = table.Column<long>(type: "INTEGER", nullable: false)
                        .Annotation("Sqlite:Autoincrement", true),
                    PatientId = table.Column<long>(type: "INTEGER", nullable: false),
                    Day = table.Column<DateOnly>(type: "TEXT", nullable: false),
                    Percent = table.Column<decimal>(type: "TEXT", precision: 5, scale: 2, nullable: false),
                    Method = table.Column<string>(type: "TEXT", maxLength: 60, nullable: false),
                    RecordedAt = table.Column<DateTime>(type: "TEXT", nullable: false),
                    ById = table.Column<Guid>(type: "TEXT", nullable: true),
                    ByName = table.Column<string>(type: "TEXT", maxLength: 100, nullable: false),
                    StruckOutAt = table.Column<DateTime>(type: "TEXT", nullable: true),
                    StruckOutBecause = table.Column<string>(type: "TEXT", maxLength: 400, nullable: true)
                },
                constraints: table =>
                {
                    table.PrimaryKey("PK_EjectionFractions", x => x.Id);
                    table.CheckConstraint("CK_EjectionFractions_Percent", "CAST(\"Percent\" AS REAL) BETWEEN 5 AND 90");
                    table.ForeignKey(
                        name: "FK_EjectionFractions_Patients_PatientId",
                        column: x => x.PatientId,
                        principalTable: "Patients",
                        principalColumn: "Id",
                        onDelete: ReferentialAction.Restrict);
                });

            migrationBuilder.CreateTable(
                name: "Flags",
                columns: table => new
                {
                    Id = table.Column<long>(type: "INTEGER", nullable: false)
                        .Annotation("Sqlite:Autoincrement", true),
                    PatientId = table.Column<long>(type: "INTEGER", nullable: false),
                    RuleId = table.Column<string>(type: "TEXT", maxLength: 60, nullable: false),
                    Subject = table.Column<string>(type: "TEXT", maxLength: 80, nullable: false),
                    EpisodeStart = table.Column<DateOnly>(type: "TEXT", nullable: false),
                    State = table.Column<int>(type: "INTEGER", nullable: false),
                    Urgency = table.Column<int>(type: "INTEGER", nullable: false),
                    Statement = table.Column<string>(type: "TEXT", maxLength: 400, nullable: false),
                    Limit = table.Column<string>(type: "TEXT", maxLength: 400, nullable: false),
                    Caution = table.Column<string>(type: "TEXT", maxLength: 400, nullable: false),
                    EvidenceJson = table.Column<string>(type: "TEXT", nullable: false),
                    SourceKeys = table.Column<string>(type: "TEXT", maxLength: 200, nullable: false),
                    Magnitude = table.Column<decimal>(type: "TEXT", precision: 14, scale: 4, nullable: true),
                    RuleVersion = table.Column<int>(type: "INTEGER", nullable: false),
                    ProtocolVersion = table.Column<int>(type: "INTEGER", nullable: false),
                    RaisedAt = table.Column<DateTime>(type: "TEXT", nullable: false),
                    LastMetOn = table.Column<DateOnly>(type: "TEXT", nullable: false),
                    NoLongerMetOn = table.Column<DateOnly>(type: "TEXT", nullable: true),
                    SeenAt = table.Column<DateTime>(type: "TEXT", nullable: true),
                    SeenByName = table.Column<string>(type: "TEXT", maxLength: 100, nullable: true),
                    PutOffUntil = table.Column<DateOnly>(type: "TEXT", nullable: true),
                    PutOffBecause = table.Column<string>(type: "TEXT", maxLength: 400, nullable: true),
                    AnsweredAt = table.Column<DateTime>(type: "TEXT", nullable: true),
                    AnsweredOn = table.Column<DateOnly>(type: "TEXT", nullable: true),
                    AnsweredByName = table.Column<string>(type: "TEXT", maxLength: 100, nullable: true),
                    AnswerStandsUntil = table.Column<DateOnly>(type: "TEXT", nullable: true),
                    Answer = table.Column<string>(type: "TEXT", maxLength: 2000, nullable: true),
                    ClearedAt = table.Column<DateTime>(type: "TEXT", nullable: true),
                    ClearedBecause = table.Column<string>(type: "TEXT", maxLength: 400, nullable: true),
                    Version = table.Column<int>(type: "INTEGER", nullable: false)
                },
                constraints: table =>
                {
                    table.PrimaryKey("PK_Flags", x => x.Id);
                    table.ForeignKey(
                        name: "FK_Flags_Patients_PatientId",
                        column: x => x.PatientId,
                        principalTable: "Patients",
                        principalColumn: "Id",
                        onDelete: ReferentialAction.Restrict);
                });

            migrationBuilder.CreateTable(
                name: "PatientSummaries",
                columns: table => new
                {
                    PatientId = table.Column<long>(type: "INTEGER", nullable: false),
                    OnDailyWeights = table.Column<bool>(type: "INTEGER", nullable: false),
                    LastGrams = table.Column<int>(type: "INTEGER", nullable: true),
                    LastWeightDay = table.Column<DateOnly>(type: "TEXT", nullable: true),
                    LastWeightAt = table.Column<DateTime>(type: "TEXT", nullable: true),
                    Gain1Day = table.Column<int>(type: "INTEGER", nullable: true),
                    Gain3Days = table.Column<int>(type: "INTEGER", nullable: true),
                    Gain7Days = table.Column<int>(type: "INTEGER", nullable: true),
                    TargetGrams = table.Column<int>(type: "INTEGER", nullable: true),
                    TargetFrom = table.Column<DateOnly>(type: "TEXT", nullable: true),
                    TrendDay = table.Column<DateOnly>(type: "TEXT", nullable: true),
                    ExcessGrams = table.Column<int>(type: "INTEGER", nullable: true),
                    ExcessErrorGrams = table.Column<int>(type: "INTEGER", nullable: true),
                    SlopeGramsPerWeek = table.Column<int>(type: "INTEGER", nullable: true),
                    SlopeBandGramsPerWeek = table.Column<int>(type: "INTEGER", nullable: true),
                    FluidBandGrams = table.Column<int>(type: "INTEGER", nullable: true),
                    FluidGrams = table.Column<int>(type: "INTEGER", nullable: true),
                    FluidScore = table.Column<decimal>(type: "TEXT", precision: 8, scale: 3, nullable: true),
                    ScatterGrams = table.Column<int>(type: "INTEGER", nullable: true),
                    IsLearning = table.Column<bool>(type: "INTEGER", nullable: false),
                    IsRising = table.Column<bool>(type: "INTEGER", nullable: false),
                    IsFalling = table.Column<bool>(type: "INTEGER", nullable: false),
                    TrendLine = table.Column<string>(type: "TEXT", maxLength: 1000, nullable: false),
                    WorstUrgency = table.Column<int>(type: "INTEGER", nullable: true),
                    WorstSince = table.Column<DateTime>(type: "TEXT", nullable: true),
                    Why = table.Column<string>(type: "TEXT", maxLength: 2000, nullable: false),
                    OpenRules = table.Column<string>(type: "TEXT", maxLength: 1000, nullable: false),
                    NotChecked = table.Column<string>(type: "TEXT", maxLength: 2000, nullable: false),
                    CheckFailed = table.Column<bool>(type: "INTEGER", nullable: false),
                    OpenFlags = table.Column<int>(type: "INTEGER", nullable: false),
                    PutOffFlags = table.Column<int>(type: "INTEGER", nullable: false),
                    HeldReadings = table.Column<int>(type: "INTEGER", nullable: false),
                    IsSilent = table.Column<bool>(type: "INTEGER", nullable: false),
                    LoopDiuretic = table.Column<string>(type: "TEXT", maxLength: 200, nullable: false),
                    LastContactDay = table.Column<DateOnly>(type: "TEXT", nullable: true),
                    LastContact = table.Column<string>(type: "TEXT", maxLength: 200, nullable: false),
                    OpenQuestions = table.Column<int>(type: "INTEGER", nullable: false),
                    AsOf = table.Column<DateOnly>(type: "TEXT", nullable: false),
                    Version = table.Column<int>(type: "INTEGER", nullable: false)
                },
                constraints: table =>
                {
                    table.PrimaryKey("PK_PatientSummaries", x => x.PatientId);
                    table.ForeignKey(
                        name: "FK_PatientSummaries_Patients_PatientId",
                        column: x => x.PatientId,
                        principalTable: "Patients",
                        principalColumn: "Id",
                        onDelete: ReferentialAction.Restrict);
                });

            migrationBuilder.CreateTable(
                name: "PatientThresholds",
                columns: table => new
                {
                    Id = table.Column<long>(type: "INTEGER", nullable: false)
                        .Annotation("Sqlite:Autoincrement", true),
                    PatientId = table.Column<long>(type: "INTEGER", nullable: false),
                    Key = table.Column<string>(type: "TEXT", maxLength: 60, nullable: false),
                    Value = table.Column<decimal>(type: "TEXT", precision: 14, scale: 4, nullable: false),
                    IsOn = table.Column<bool>(type: "INTEGER", nullable: false),
                    Reason = table.Column<string>(type: "TEXT", maxLength: 400, nullable: false),
                    RecordedAt = table.Column<DateTime>(type: "TEXT", nullable: false),
                    ById = table.Column<Guid>(type: "TEXT", nullable: true),
                    ByName = table.Column<string>(type: "TEXT", maxLength: 100, nullable: false),
                    EndedAt = table.Column<DateTime>(type: "TEXT", nullable: true)
                },
                constraints: table =>
                {
                    table.PrimaryKey("PK_PatientThresholds", x => x.Id);
                    table.ForeignKey(
                        name: "FK_PatientThresholds_Patients_PatientId",
                        column: x => x.PatientId,
                        principalTable: "Patients",
                        principalColumn: "Id",
                        onDelete: ReferentialAction.Restrict);
                });

            migrationBuilder.CreateTable(
                name: "Questions",
                columns: table => new
                {
                    Id = table.Column<long>(type: "INTEGER", nullable: false)
                        .Annotation("Sqlite:Autoincrement", true),
                    PatientId = table.Column<long>(type: "INTEGER", nullable: false),
                    FlagId = table.Column<long>(type: "INTEGER", nullable: true),
                    Text = table.Column<string>(type: "TEXT", maxLength: 4000, nullable: false),
                    AskedAt = table.Column<DateTime>(type: "TEXT", nullable: false),
                    AskedById = table.Column<Guid>(type: "TEXT", nullable: true),
                    AskedByName = table.Column<string>(type: "TEXT", maxLength: 100, nullable: false),
                    Answer = table.Column<string>(type: "TEXT", maxLength: 4000, nullable: true),
                    AnsweredAt = table.Column<DateTime>(type: "TEXT", nullable: true),
                    AnsweredById = table.Column<Guid>(type: "TEXT", nullable: true),
                    AnsweredByName = table.Column<string>(type: "TEXT", maxLength: 100, nullable: true),
                    AnswerSeenAt = table.Column<DateTime>(type: "TEXT", nullable: true),
                    AnswerSeenByName = table.Column<string>(type: "TEXT", maxLength: 100, nullable: true),
                    Version = table.Column<int>(type: "INTEGER", nullable: false)
                },
                constraints: table =>
                {
                    table.PrimaryKey("PK_Questions", x => x.Id);
                    table.ForeignKey(
                        name: "FK_Questions_Patients_PatientId",
                        column: x => x.PatientId,
                        principalTable: "Patients",
                        principalColumn: "Id",
                        onDelete: ReferentialAction.Restrict);
                });

            migrationBuilder.CreateTable(
                name: "Readings",
                columns: table => new
                {
                    Id = table.Column<long>(type: "INTEGER", nullable: false)
                        .Annotation("Sqlite:Autoincrement", true),
                    PatientId = table.Column<long>(type: "INTEGER", nullable: false),
                    Kind = table.Column<int>(type: "INTEGER", nullable: false),
                    MeasuredAt = table.Column<DateTime>(type: "TEXT", nullable: false),
                    Day = table.Column<DateOnly>(type: "TEXT", nullable: false),
                    Value = table.Column<int>(type: "INTEGER", nullable: false),
                    AsTyped = table.Column<string>(type: "TEXT", maxLength: 40, nullable: true),
                    Source = table.Column<int>(type: "INTEGER", nullable: false),
                    Device = table.Column<string>(type: "TEXT", maxLength: 60, nullable: true),
                    State = table.Column<int>(type: "INTEGER", nullable: false),
                    FirstState = table.Column<int>(type: "INTEGER", nullable: false),
                    HoldReason = table.Column<int>(type: "INTEGER", nullable: true),
                    RecordedAt = table.Column<DateTime>(type: "TEXT", nullable: false),
                    RecordedById = table.Column<Guid>(type: "TEXT", nullable: true),
                    SupersedesId = table.Column<long>(type: "INTEGER", nullable: true),
                    ImportId = table.Column<long>(type: "INTEGER", nullable: true)
                },
                constraints: table =>
                {
                    table.PrimaryKey("PK_Readings", x => x.Id);
                    table.CheckConstraint("CK_Readings_Held", "\"FirstState\" <> 2 OR \"HoldReason\" IS NOT NULL");
                    table.CheckConstraint("CK_Readings_State", "\"State\" BETWEEN 1 AND 4 AND \"FirstState\" BETWEEN 1 AND 2");
                    table.CheckConstraint("CK_Readings_Value", "(\"Kind\" = 1 AND \"Value\" BETWEEN 25000 AND 300000) OR (\"Kind\" IN (2, 3) AND \"Value\" BETWEEN 20 AND 300)\nOR (\"Kind\" = 4 AND \"Value\" BETWEEN 20 AND 300) OR (\"Kind\" = 5 AND \"Value\" BETWEEN 30 AND 100)");
                    table.ForeignKey(
                        name: "FK_Readings_Patients_PatientId",
                        column: x => x.PatientId,
                        principalTable: "Patients",
                        principalColumn: "Id",
                        onDelete: ReferentialAction.Restrict);
                });

            migrationBuilder.CreateTable(
                name: "SymptomReports",
                columns: table => new
                {
                    Id = table.Column<long>(type: "INTEGER", nullable: false)
                        .Annotation("Sqlite:Autoincrement", true),
                    PatientId = table.Column<long>(type: "INTEGER", nullable: false),
                    Day = table.Column<DateOnly>(type: "TEXT", nullable: false),
                    Symptoms = table.Column<int>(type: "INTEGER", nullable: false),
                    Note = table.Column<string>(type: "TEXT", maxLength: 1000, nullable: true),
                    Source = table.Column<int>(type: "INTEGER", nullable: false),
                    RecordedAt = table.Column<DateTime>(type: "TEXT", nullable: false),
                    ById = table.Column<Guid>(type: "TEXT", nullable: true),
                    ByName = table.Column<string>(type: "TEXT", maxLength: 100, nullable: false),
                    StruckOutAt = table.Column<DateTime>(type: "TEXT", nullable: true),
                    StruckOutBecause = table.Column<string>(type: "TEXT", maxLength: 400, nullable: true)
                },
                constraints: table =>
                {
                    table.PrimaryKey("PK_SymptomReports", x => x.Id);
                    table.ForeignKey(
                        name: "FK_SymptomReports_Patients_PatientId",
                        column: x => x.PatientId,
                        principalTable: "Patients",
                        principalColumn: "Id",
                        onDelete: ReferentialAction.Restrict);
                });

            migrationBuilder.CreateTable(
                name: "TargetWeights",
                columns: table => new
                {
                    Id = table.Column<long>(type: "INTEGER", nullable: false)
                        .Annotation("Sqlite:Autoincrement", true),
                    PatientId = table.Column<long>(type: "INTEGER", nullable: false),
                    From = table.Column<DateOnly>(type: "TEXT", nullable: false),
                    Grams = table.Column<int>(type: "INTEGER", nullable: false),
                    Reason = table.Column<string>(type: "TEXT", maxLength: 400, nullable: true),
                    ById = table.Column<Guid>(type: "TEXT", nullable: true),
                    ByName = table.Column<string>(type: "TEXT", maxLength: 100, nullable: false),
                    RecordedAt = table.Column<DateTime>(type: "TEXT", nullable: false),
                    StruckOutAt = table.Column<DateTime>(type: "TEXT", nullable: true),
                    StruckOutBecause = table.Column<string>(type: "TEXT", maxLength: 400, nullable: true)
                },
                constraints: table =>
                {
                    table.PrimaryKey("PK_TargetWeights", x => x.Id);
                    table.CheckConstraint("CK_TargetWeights_Grams", "\"Grams\" BETWEEN 25000 AND 300000");
                    table.ForeignKey(
                        name: "FK_TargetWeights_Patients_PatientId",
                        column: x => x.PatientId,
                        principalTable: "Patients",
                        principalColumn: "Id",
                        onDelete: ReferentialAction.Restrict);
                });

            migrationBuilder.CreateTable(
                name: "Visits",
                columns: table => new
                {
                    Id = table.Column<long>(type: "INTEGER", nullable: false)
                        .Annotation("Sqlite:Autoincrement", true),
                    PatientId = table.Column<long>(type: "INTEGER", nullable: false),
                    Day = table.Column<DateOnly>(type: "TEXT", nullable: false),
                    Kind = table.Column<int>(type: "INTEGER", nullable: false),
                    NyhaClass = table.Column<int>(type: "INTEGER", nullable: true),
                    Rhythm = table.Column<string>(type: "TEXT", maxLength: 60, nullable: true),
                    Note = table.Column<string>(type: "TEXT", maxLength: 4000, nullable: true),
                    RecordedAt = table.Column<DateTime>(type: "TEXT", nullable: false),
                    ById = table.Column<Guid>(type: "TEXT", nullable: true),
                    ByName = table.Column<string>(type: "TEXT", maxLength: 100, nullable: false)
                },
                constraints: table =>
                {
                    table.PrimaryKey("PK_Visits", x => x.Id);
                    table.CheckConstraint("CK_Visits_Nyha", "\"NyhaClass\" IS NULL OR \"NyhaClass\" BETWEEN 1 AND 4");
                    table.ForeignKey(
                        name: "FK_Visits_Patients_PatientId",
                        column: x => x.PatientId,
                        principalTable: "Patients",
                        principalColumn: "Id",
                        onDelete: ReferentialAction.Restrict);
                });

            migrationBuilder.CreateTable(
                name: "FlagSteps",
                columns: table => new
                {
                    Id = table.Column<long>(type: "INTEGER", nullable: false)
                        .Annotation("Sqlite:Autoincrement", true),
                    FlagId = table.Column<long>(type: "INTEGER", nullable: false),
                    PatientId = table.Column<long>(type: "INTEGER", nullable: false),
                    Kind = table.Column<int>(type: "INTEGER", nullable: false),
                    At = table.Column<DateTime>(type: "TEXT", nullable: false),
                    ById = table.Column<Guid>(type: "TEXT", nullable: true),
                    ByName = table.Column<string>(type: "TEXT", maxLength: 100, nullable: false),
                    Urgency = table.Column<int>(type: "INTEGER", nullable: false),
                    Statement = table.Column<string>(type: "TEXT", maxLength: 400, nullable: false),
                    Limit = table.Column<string>(type: "TEXT", maxLength: 400, nullable: false),
                    Caution = table.Column<string>(type: "TEXT", maxLength: 400, nullable: false),
                    EvidenceJson = table.Column<string>(type: "TEXT", nullable: false),
                    RuleVersion = table.Column<int>(type: "INTEGER", nullable: false),
                    ProtocolVersion = table.Column<int>(type: "INTEGER", nullable: false),
                    Note = table.Column<string>(type: "TEXT", maxLength: 2000, nullable: true)
                },
                constraints: table =>
                {
                    table.PrimaryKey("PK_FlagSteps", x => x.Id);
                    table.ForeignKey(
                        name: "FK_FlagSteps_Flags_FlagId",
                        column: x => x.FlagId,
                        principalTable: "Flags",
                        principalColumn: "Id",
                        onDelete: ReferentialAction.Restrict);
                });

            migrationBuilder.CreateTable(
                name: "ReadingDecisions",
                columns: table => new
                {
                    Id = table.Column<long>(type: "INTEGER", nullable: false)
                        .Annotation("Sqlite:Autoincrement", true),
                    ReadingId = table.Column<long>(type: "INTEGER", nullable: false),
                    PatientId = table.Column<long>(type: "INTEGER", nullable: false),
                    From = table.Column<int>(type: "INTEGER", nullable: false),
                    To = table.Column<int>(type: "INTEGER", nullable: false),
                    ReplacementId = table.Column<long>(type: "INTEGER", nullable: true),
                    Reason = table.Column<string>(type: "TEXT", maxLength: 400, nullable: false),
                    At = table.Column<DateTime>(type: "TEXT", nullable: false),
                    ById = table.Column<Guid>(type: "TEXT", nullable: true),
                    ByName = table.Column<string>(type: "TEXT", maxLength: 100, nullable: false)
                },
                constraints: table =>
                {
                    table.PrimaryKey("PK_ReadingDecisions", x => x.Id);
                    table.ForeignKey(
                        name: "FK_ReadingDecisions_Readings_ReadingId",
                        column: x => x.ReadingId,
                        principalTable: "Readings",
                        principalColumn: "Id",
                        onDelete: ReferentialAction.Restrict);
                });

            migrationBuilder.InsertData(
                table: "AspNetRoles",
                columns: new[] { "Id", "ConcurrencyStamp", "Name", "NormalizedName" },
                values: new object[,]
                {
                    { new Guid("00000001-4846-4100-8000-000000000000"), "Nurse", "Nurse", "NURSE" },
                    { new Guid("00000002-4846-4100-8000-000000000000"), "Prescriber", "Prescriber", "PRESCRIBER" },
                    { new Guid("00000003-4846-4100-8000-000000000000"), "Coordinator", "Coordinator", "COORDINATOR" },
                    { new Guid("00000004-4846-4100-8000-000000000000"), "Administrator", "Administrator", "ADMINISTRATOR" }
                });

            migrationBuilder.InsertData(
                table: "AuditHeads",
                columns: new[] { "Id", "LastHash", "LastId" },
                values: new object[] { 1, "", 0L });

            migrationBuilder.CreateIndex(
                name: "IX_AspNetRoleClaims_RoleId",
                table: "AspNetRoleClaims",
                column: "RoleId");

            migrationBuilder.CreateIndex(
                name: "RoleNameIndex",
                table: "AspNetRoles",
                column: "NormalizedName",
                unique: true);

            migrationBuilder.CreateIndex(
                name: "IX_AspNetUserClaims_UserId",
                table: "AspNetUserClaims",
                column: "UserId");

            migrationBuilder.CreateIndex(
                name: "IX_AspNetUserLogins_UserId",
                table: "AspNetUserLogins",
                column: "UserId");

            migrationBuilder.CreateIndex(
                name: "IX_AspNetUserRoles_RoleId",
                table: "AspNetUserRoles",
                column: "RoleId");

            migrationBuilder.CreateIndex(
                name: "EmailIndex",
                table: "AspNetUsers",
                column: "NormalizedEmail");

            migrationBuilder.CreateIndex(
                name: "UserNameIndex",
                table: "AspNetUsers",
                column: "NormalizedUserName",
                unique: true);

            migrationBuilder.CreateIndex(
                name: "IX_AuditEntries_At",
                table: "AuditEntries",
                column: "At");

            migrationBuilder.CreateIndex(
                name: "IX_AuditEntries_PatientId_At",
                table: "AuditEntries",
                columns: new[] { "PatientId", "At" });

            migrationBuilder.CreateIndex(
                name: "IX_BloodTests_PatientId_Analyte_TakenAt",
                table: "BloodTests",
                columns: new[] { "PatientId", "Analyte", "TakenAt" });

            migrationBuilder.CreateIndex(
                name: "IX_Contacts_PatientId_At",
                table: "Contacts",
                columns: new[] { "PatientId", "At" });

            migrationBuilder.CreateIndex(
                name: "IX_DoseCourses_PatientId_From",
                table: "DoseCourses",
                columns: new[] { "PatientId", "From" });

            migrationBuilder.CreateIndex(
                name: "IX_EjectionFractions_PatientId_Day",
                table: "EjectionFractions",
                columns: new[] { "PatientId", "Day" });

            migrationBuilder.CreateIndex(
                name: "IX_Flags_PatientId_RuleId_Subject",
                table: "Flags",
                columns: new[] { "PatientId", "RuleId", "Subject" },
                unique: true,
                filter: "\"State\" = 1");

            migrationBuilder.CreateIndex(
                name: "IX_Flags_PatientId_State",
                table: "Flags",
                columns: new[] { "PatientId", "State" });

            migrationBuilder.CreateIndex(
                name: "IX_Flags_RaisedAt",
                table: "Flags",
                column: "RaisedAt");

            migrationBuilder.CreateIndex(
                name: "IX_FlagSteps_FlagId",
                table: "FlagSteps",
                column: "FlagId");

            migrationBuilder.CreateIndex(
                name: "IX_FlagSteps_PatientId_At",
                table: "FlagSteps",
                columns: new[] { "PatientId", "At" });

            migrationBuilder.CreateIndex(
                name: "IX_ImportLines_ImportId_LineNumber",
                table: "ImportLines",
                columns: new[] { "ImportId", "LineNumber" });

            migrationBuilder.CreateIndex(
                name: "IX_ImportRuns_StartedAt",
                table: "ImportRuns",
                column: "StartedAt");

            migrationBuilder.CreateIndex(
                name: "IX_ImportRuns_State",
                table: "ImportRuns",
                column: "State",
                filter: "\"State\" = 1");

            migrationBuilder.CreateIndex(
                name: "IX_Patients_ClinicNumber",
                table: "Patients",
                column: "ClinicNumber",
                unique: true);

            migrationBuilder.CreateIndex(
                name: "IX_Patients_Household",
                table: "Patients",
                column: "Household");

            migrationBuilder.CreateIndex(
                name: "IX_PatientSummaries_OnDailyWeights_WorstUrgency_WorstSince",
                table: "PatientSummaries",
                columns: new[] { "OnDailyWeights", "WorstUrgency", "WorstSince" });

            migrationBuilder.CreateIndex(
                name: "IX_PatientThresholds_PatientId_Key",
                table: "PatientThresholds",
                columns: new[] { "PatientId", "Key" },
                unique: true,
                filter: "\"EndedAt\" IS NULL");

            migrationBuilder.CreateIndex(
                name: "IX_Questions_AnsweredAt",
                table: "Questions",
                column: "AnsweredAt");

            migrationBuilder.CreateIndex(
                name: "IX_Questions_PatientId_AskedAt",
                table: "Questions",
                columns: new[] { "PatientId", "AskedAt" });

            migrationBuilder.CreateIndex(
                name: "IX_ReadingDecisions_PatientId_At",
                table: "ReadingDecisions",
                columns: new[] { "PatientId", "At" });

            migrationBuilder.CreateIndex(
                name: "IX_ReadingDecisions_ReadingId",
                table: "ReadingDecisions",
                column: "ReadingId");

            migrationBuilder.CreateIndex(
                name: "IX_Readings_PatientId_Day",
                table: "Readings",
                columns: new[] { "PatientId", "Day" });

            migrationBuilder.CreateIndex(
                name: "IX_Readings_PatientId_Kind_MeasuredAt_Value",
                table: "Readings",
                columns: new[] { "PatientId", "Kind", "MeasuredAt", "Value" },
                unique: true,
                filter: "\"SupersedesId\" IS NULL");

            migrationBuilder.CreateIndex(
                name: "IX_Readings_State",
                table: "Readings",
                column: "State",
                filter: "\"State\" = 2");

            migrationBuilder.CreateIndex(
                name: "IX_SymptomReports_PatientId_Day",
                table: "SymptomReports",
                columns: new[] { "PatientId", "Day" });

            migrationBuilder.CreateIndex(
                name: "IX_TargetWeights_PatientId_From",
                table: "TargetWeights",
                columns: new[] { "PatientId", "From" });

            migrationBuilder.CreateIndex(
                name: "IX_Visits_PatientId_Day",
                table: "Visits",
                columns: new[] { "PatientId", "Day" });
        }

        /// <inheritdoc />
        protected override void Down(MigrationBuilder migrationBuilder)
        {
            migrationBuilder.DropTable(
                name: "AspNetRoleClaims");

            migrationBuilder.DropTable(
                name: "AspNetUserClaims");

            migrationBuilder.DropTable(
                name: "AspNetUserLogins");

            migrationBuilder.DropTable(
                name: "AspNetUserRoles");

            migrationBuilder.DropTable(
                name: "AspNetUserTokens");

            migrationBuilder.DropTable(
                name: "AuditEntries");

            migrationBuilder.DropTable(
                name: "AuditHeads");

            migrationBuilder.DropTable(
                name: "BloodTests");

            migrationBuilder.DropTable(
                name: "Contacts");

            migrationBuilder.DropTable(
                name: "DataProtectionKeys");

            migrationBuilder.DropTable(
                name: "DoseCourses");

            migrationBuilder.DropTable(
                name: "EjectionFractions");

            migrationBuilder.DropTable(
                name: "FlagSteps");

            migrationBuilder.DropTable(
                name: "ImportLines");

            migrationBuilder.DropTable(
                name: "PatientSummaries");

            migrationBuilder.DropTable(
                name: "PatientThresholds");

            migrationBuilder.DropTable(
                name: "Questions");

            migrationBuilder.DropTable(
                name: "ReadingDecisions");

            migrationBuilder.DropTable(
                name: "Settings");

            migrationBuilder.DropTable(
                name: "SweepRuns");

            migrationBuilder.DropTable(
                name: "SymptomReports");

            migrationBuilder.DropTable(
                name: "TargetWeights");

            migrationBuilder.DropTable(
                name: "Visits");

            migrationBuilder.DropTable(
                name: "AspNetRoles");

            migrationBuilder.DropTable(
                name: "AspNetUsers");

            migrationBuilder.DropTable(
                name: "Flags");

            migrationBuilder.DropTable(
                name: "ImportRuns");

            migrationBuilder.DropTable(
                name: "Readings");

            migrationBuilder.DropTable(
                name: "Patients");
        }
    }
}

using System;
using System.Collections.Generic;
using Microsoft.EntityFrameworkCore.Migrations;
using NodaTime;
using Npgsql.EntityFrameworkCore.PostgreSQL.Metadata;

#nullable disable

namespace UnitVent.Store.Schema.Migrations
{
    /// <inheritdoc />
    public partial class Initial : Migration
    {
        /// <inheritdoc />
        protected override void Up(MigrationBuilder migrationBuilder)
        {
            migrationBuilder.CreateTable(
                name: "account",
                columns: table => new
                {
                    id = table.Column<Guid>(type: "uuid", nullable: false),
                    display_name = table.Column<string>(type: "text", nullable: false),
                    is_administrator = table.Column<bool>(type: "boolean", nullable: false),
                    disabled = table.Column<bool>(type: "boolean", nullable: false),
                    must_change_password = table.Column<bool>(type: "boolean", nullable: false),
                    user_name = table.Column<string>(type: "character varying(256)", maxLength: 256, nullable: true),
                    normalized_user_name = table.Column<string>(type: "character varying(256)", maxLength: 256, nullable: true),
                    email = table.Column<string>(type: "character varying(256)", maxLength: 256, nullable: true),
                    normalized_email = table.Column<string>(type: "character varying(256)", maxLength: 256, nullable: true),
                    email_confirmed = table.Column<bool>(type: "boolean", nullable: false),
                    password_hash = table.Column<string>(type: "text", nullable: true),
                    security_stamp = table.Column<string>(type: "text", nullable: true),
                    concurrency_stamp = table.Column<string>(type: "text", nullable: true),
                    phone_number = table.Column<string>(type: "text", nullable: true),
                    phone_number_confirmed = table.Column<bool>(type: "boolean", nullable: false),
                    two_factor_enabled = table.Column<bool>(type: "boolean", nullable: false),
                    lockout_end = table.Column<DateTimeOffset>(type: "timestamp with time zone", nullable: true),
                    lockout_enabled = table.Column<bool>(type: "boolean", nullable: false),
                    access_failed_count = table.Column<int>(type: "integer", nullable: false)
                },
                constraints: table =>
                {
                    table.PrimaryKey("pk_account", x => x.id);
                });

            migrationBuilder.CreateTable(
                name: "audit_event",
                columns: table => new
                {
                    unit_id = table.Column<Guid>(type: "uuid", nullable: false),
                    number = table.Column<long>(type: "bigint", nullable: false),
                    at = table.Column<Instant>(type: "timestamp with time zone", nullable: false),
                    who = table.Column<string>(type: "text", nullable: false),
                    what = table.Column<string>(type: "text", nullable: false),
                    subject = table.Column<Guid>(type: "uuid", nullable: true),
                    detail = table.Column<string>(type: "text", nullable: false),
                    previous_hash = table.Column<byte[]>(type: "bytea", nullable: false),
                    hash = table.Column<byte[]>(type: "bytea", nullable: false)
                },
                constraints: table =>
                {
                    table.PrimaryKey("pk_audit_event", x => new { x.unit_id, x.number });
                });

            migrationBuilder.CreateTable(
                name: "data_protection_keys",
                columns: table => new
                {
                    id = table.Column<int>(type: "integer", nullable: false)
                        .Annotation("Npgsql:ValueGenerationStrategy", NpgsqlValueGenerationStrategy.IdentityByDefaultColumn),
                    friendly_name = table.Column<string>(type: "text", nullable: true),
                    xml = table.Column<string>(type: "text", nullable: true)
                },
                constraints: table =>
                {
                    table.PrimaryKey("pk_data_protection_keys", x => x.id);
                });

            migrationBuilder.CreateTable(
                name: "patient",
                columns: table => new
                {
                    unit_id = table.Column<Guid>(type: "uuid", nullable: false),
                    id = table.Column<Guid>(type: "uuid", nullable: false),
                    mrn = table.Column<string>(type: "text", nullable: false),
                    facts = table.Column<string>(type: "jsonb", nullable: false),
                    xmin = table.Column<uint>(type: "xid", rowVersion: true, nullable: false)
                },
                constraints: table =>
                {
                    table.PrimaryKey("pk_patient", x => new { x.unit_id, x.id });
                });

            migrationBuilder.CreateTable(
                name: "role",
                columns: table => new
                {
                    id = table.Column<Guid>(type: "uuid", nullable: false),
                    name = table.Column<string>(type: "character varying(256)", maxLength: 256, nullable: true),
                    normalized_name = table.Column<string>(type: "character varying(256)", maxLength: 256, nullable: true),
                    concurrency_stamp = table.Column<string>(type: "text", nullable: true)
                },
                constraints: table =>
                {
                    table.PrimaryKey("pk_role", x => x.id);
                });

            migrationBuilder.CreateTable(
                name: "set_up",
                columns: table => new
                {
                    id = table.Column<int>(type: "integer", nullable: false),
                    secret_hash = table.Column<byte[]>(type: "bytea", nullable: false),
                    done_at = table.Column<Instant>(type: "timestamp with time zone", nullable: true)
                },
                constraints: table =>
                {
                    table.PrimaryKey("pk_set_up", x => x.id);
                });

            migrationBuilder.CreateTable(
                name: "unit",
                columns: table => new
                {
                    id = table.Column<Guid>(type: "uuid", nullable: false),
                    code = table.Column<string>(type: "text", nullable: false),
                    name = table.Column<string>(type: "text", nullable: false),
                    time_zone = table.Column<string>(type: "text", nullable: false),
                    altitude_m = table.Column<double>(type: "double precision", nullable: false),
                    tension_unit = table.Column<string>(type: "text", nullable: false),
                    method = table.Column<string>(type: "text", nullable: false),
                    check_interval = table.Column<Duration>(type: "interval", nullable: false),
                    shift_starts = table.Column<List<LocalTime>>(type: "time[]", nullable: false),
                    is_demo = table.Column<bool>(type: "boolean", nullable: false),
                    created_at = table.Column<Instant>(type: "timestamp with time zone", nullable: false),
                    xmin = table.Column<uint>(type: "xid", rowVersion: true, nullable: false)
                },
                constraints: table =>
                {
                    table.PrimaryKey("pk_unit", x => x.id);
                });

            migrationBuilder.CreateTable(
                name: "unit_lookup",
                columns: table => new
                {
                    id = table.Column<Guid>(type: "uuid", nullable: false),
                    unit_id = table.Column<Guid>(type: "uuid", nullable: false),
                    episode_id = table.Column<Guid>(type: "uuid", nullable: false)
                },
                constraints: table =>
                {
                    table.PrimaryKey("pk_unit_lookup", x => x.id);
                });

            migrationBuilder.CreateTable(
                name: "account_claim",
                columns: table => new
                {
                    id = table.Column<int>(type: "integer", nullable: false)
                        .Annotation("Npgsql:ValueGenerationStrategy", NpgsqlValueGenerationStrategy.IdentityByDefaultColumn),
                    user_id = table.Column<Guid>(type: "uuid", nullable: false),
                    claim_type = table.Column<string>(type: "text", nullable: true),
                    claim_value = table.Column<string>(type: "text", nullable: true)
                },
                constraints: table =>
                {
                    table.PrimaryKey("pk_account_claim", x => x.id);
                    table.ForeignKey(
                        name: "fk_account_claim_account_user_id",
                        column: x => x.user_id,
                        principalTable: "account",
                        principalColumn: "id",
                        onDelete: ReferentialAction.Cascade);
                });

            migrationBuilder.CreateTable(
                name: "account_login",
                columns: table => new
                {
                    login_provider = table.Column<string>(type: "text", nullable: false),
                    provider_key = table.Column<string>(type: "text", nullable: false),
                    provider_display_name = table.Column<string>(type: "text", nullable: true),
                    user_id = table.Column<Guid>(type: "uuid", nullable: false)
                },
                constraints: table =>
                {
                    table.PrimaryKey("pk_account_login", x => new { x.login_provider, x.provider_key });
                    table.ForeignKey(
                        name: "fk_account_login_account_user_id",
                        column: x => x.user_id,
                        principalTable: "account",
                        principalColumn: "id",
                        onDelete: ReferentialAction.Cascade);
                });

            migrationBuilder.CreateTable(
                name: "account_token",
                columns: table => new
                {
                    user_id = table.Column<Guid>(type: "uuid", nullable: false),
                    login_provider = table.Column<string>(type: "text", nullable: false),
                    name = table.Column<string>(type: "text", nullable: false),
                    value = table.Column<string>(type: "text", nullable: true)
                },
                constraints: table =>
                {
                    table.PrimaryKey("pk_account_token", x => new { x.user_id, x.login_provider, x.name });
                    table.ForeignKey(
                        name: "fk_account_token_account_user_id",
                        column: x => x.user_id,
                        principalTable: "account",
                        principalColumn: "id",
                        onDelete: ReferentialAction.Cascade);
                });

            migrationBuilder.CreateTable(
                name: "episode",
                columns: table => new
                {
                    unit_id = table.Column<Guid>(type: "uuid", nullable: false),
                    id = table.Column<Guid>(type: "uuid", nullable: false),
                    patient_id = table.Column<Guid>(type: "uuid", nullable: false),
                    admitted_at = table.Column<Instant>(type: "timestamp with time zone", nullable: false),
                    airway_secured_at = table.Column<Instant>(type: "timestamp with time zone", nullable: false),
                    reason = table.Column<string>(type: "text", nullable: true),
                    ended_at = table.Column<Instant>(type: "timestamp with time zone", nullable: true),
                    outcome = table.Column<string>(type: "text", nullable: true),
                    next_evaluation_at = table.Column<Instant>(type: "timestamp with time zone", nullable: true)
                },
                constraints: table =>
                {
                    table.PrimaryKey("pk_episode", x => new { x.unit_id, x.id });
                    table.ForeignKey(
                        name: "fk_episode_patient_unit_id_patient_id",
                        columns: x => new { x.unit_id, x.patient_id },
                        principalTable: "patient",
                        principalColumns: new[] { "unit_id", "id" },
                        onDelete: ReferentialAction.Restrict);
                });

            migrationBuilder.CreateTable(
                name: "patient_fact",
                columns: table => new
                {
                    unit_id = table.Column<Guid>(type: "uuid", nullable: false),
                    id = table.Column<Guid>(type: "uuid", nullable: false),
                    patient_id = table.Column<Guid>(type: "uuid", nullable: false),
                    recorded_at = table.Column<Instant>(type: "timestamp with time zone", nullable: false),
                    recorded_by = table.Column<string>(type: "text", nullable: false),
                    reason = table.Column<string>(type: "text", nullable: true),
                    facts = table.Column<string>(type: "jsonb", nullable: false)
                },
                constraints: table =>
                {
                    table.PrimaryKey("pk_patient_fact", x => new { x.unit_id, x.id });
                    table.ForeignKey(
                        name: "fk_patient_fact_patient_unit_id_patient_id",
                        columns: x => new { x.unit_id, x.patient_id },
                        principalTable: "patient",
                        principalColumns: new[] { "unit_id", "id" },
                        onDelete: ReferentialAction.Restrict);
                });

            migrationBuilder.CreateTable(
                name: "account_role",
                columns: table => new
                {
                    user_id = table.Column<Guid>(type: "uuid", nullable: false),
                    role_id = table.Column<Guid>(type: "uuid", nullable: false)
                },
                constraints: table =>
                {
                    table.PrimaryKey("pk_account_role", x => new { x.user_id, x.role_id });
                    table.ForeignKey(
                        name: "fk_account_role_account_user_id",
                        column: x => x.user_id,
                        principalTable: "account",
                        principalColumn: "id",
                        onDelete: ReferentialAction.Cascade);
                    table.ForeignKey(
                        name: "fk_account_role_asp_net_roles_role_id",
                        column: x => x.role_id,
                        principalTable: "role",
                        principalColumn: "id",
                        onDelete: ReferentialAction.Cascade);
                });

            migrationBuilder.CreateTable(
                name: "role_claim",
                columns: table => new
                {
                    id = table.Column<int>(type: "integer", nullable: false)
                        .Annotation("Npgsql:ValueGenerationStrategy", NpgsqlValueGenerationStrategy.IdentityByDefaultColumn),
                    role_id = table.Column<Guid>(type: "uuid", nullable: false),
                    claim_type = table.Column<string>(type: "text", nullable: true),
                    claim_value = table.Column<string>(type: "text", nullable: true)
                },
                constraints: table =>
                {
                    table.PrimaryKey("pk_role_claim", x => x.id);
                    table.ForeignKey(
                        name: "fk_role_claim_role_role_id",
                        column: x => x.role_id,
                        principalTable: "role",
                        principalColumn: "id",
                        onDelete: ReferentialAction.Cascade);
                });

            migrationBuilder.CreateTable(
                name: "api_token",
                columns: table => new
                {
                    id = table.Column<Guid>(type: "uuid", nullable: false),
                    unit_id = table.Column<Guid>(type: "uuid", nullable: false),
                    role = table.Column<string>(type: "text", nullable: false),
                    name = table.Column<string>(type: "text", nullable: false),
                    hash = table.Column<byte[]>(type: "bytea", nullable: false),
                    created_at = table.Column<Instant>(type: "timestamp with time zone", nullable: false),
                    expires_at = table.Column<Instant>(type: "timestamp with time zone", nullable: false),
                    revoked_at = table.Column<Instant>(type: "timestamp with time zone", nullable: true),
                    last_used_at = table.Column<Instant>(type: "timestamp with time zone", nullable: true)
                },
                constraints: table =>
                {
                    table.PrimaryKey("pk_api_token", x => x.id);
                    table.ForeignKey(
                        name: "fk_api_token_units_unit_id",
                        column: x => x.unit_id,
                        principalTable: "unit",
                        principalColumn: "id",
                        onDelete: ReferentialAction.Restrict);
                });

            migrationBuilder.CreateTable(
                name: "bed",
                columns: table => new
                {
                    unit_id = table.Column<Guid>(type: "uuid", nullable: false),
                    id = table.Column<Guid>(type: "uuid", nullable: false),
                    name = table.Column<string>(type: "text", nullable: false),
                    position = table.Column<int>(type: "integer", nullable: false),
                    retired = table.Column<bool>(type: "boolean", nullable: false)
                },
                constraints: table =>
                {
                    table.PrimaryKey("pk_bed", x => new { x.unit_id, x.id });
                    table.ForeignKey(
                        name: "fk_bed_units_unit_id",
                        column: x => x.unit_id,
                        principalTable: "unit",
                        principalColumn: "id",
                        onDelete: ReferentialAction.Restrict);
                });

            migrationBuilder.CreateTable(
                name: "membership",
                columns: table => new
                {
                    unit_id = table.Column<Guid>(type: "uuid", nullable: false),
                    user_id = table.Column<Guid>(type: "uuid", nullable: false),
                    role = table.Column<string>(type: "text", nullable: false)
                },
                constraints: table =>
                {
                    table.PrimaryKey("pk_membership", x => new { x.unit_id, x.user_id });
                    table.ForeignKey(
                        name: "fk_membership_asp_net_users_user_id",
                        column: x => x.user_id,
                        principalTable: "account",
                        principalColumn: "id",
                        onDelete: ReferentialAction.Restrict);
                    table.ForeignKey(
                        name: "fk_membership_units_unit_id",
                        column: x => x.unit_id,
                        principalTable: "unit",
                        principalColumn: "id",
                        onDelete: ReferentialAction.Restrict);
                });

            migrationBuilder.CreateTable(
                name: "entry",
                columns: table => new
                {
                    unit_id = table.Column<Guid>(type: "uuid", nullable: false),
                    id = table.Column<Guid>(type: "uuid", nullable: false),
                    episode_id = table.Column<Guid>(type: "uuid", nullable: false),
                    kind = table.Column<string>(type: "text", nullable: false),
                    effective_at = table.Column<Instant>(type: "timestamp with time zone", nullable: false),
                    recorded_at = table.Column<Instant>(type: "timestamp with time zone", nullable: false),
                    recorded_by = table.Column<string>(type: "text", nullable: false),
                    recorded_by_id = table.Column<Guid>(type: "uuid", nullable: true),
                    sequence = table.Column<long>(type: "bigint", nullable: false)
                        .Annotation("Npgsql:ValueGenerationStrategy", NpgsqlValueGenerationStrategy.IdentityAlwaysColumn),
                    corrects = table.Column<Guid>(type: "uuid", nullable: true),
                    correction_reason = table.Column<string>(type: "text", nullable: true),
                    confirmed = table.Column<List<string>>(type: "text[]", nullable: false),
                    body = table.Column<string>(type: "jsonb", nullable: false)
                },
                constraints: table =>
                {
                    table.PrimaryKey("pk_entry", x => new { x.unit_id, x.id });
                    table.ForeignKey(
                        name: "fk_entry_entry_unit_id_corrects",
                        columns: x => new { x.unit_id, x.corrects },
                        principalTable: "entry",
                        principalColumns: new[] { "unit_id", "id" },
                        onDelete: ReferentialAction.Restrict);
                    table.ForeignKey(
                        name: "fk_entry_episode_unit_id_episode_id",
                        columns: x => new { x.unit_id, x.episode_id },
                        principalTable: "episode",
                        principalColumns: new[] { "unit_id", "id" },
                        onDelete: ReferentialAction.Restrict);
                });

            migrationBuilder.CreateTable(
                name: "episode_event",
                columns: table => new
                {
                    unit_id = table.Column<Guid>(type: "uuid", nullable: false),
                    id = table.Column<Guid>(type: "uuid", nullable: false),
                    episode_id = table.Column<Guid>(type: "uuid", nullable: false),
                    kind = table.Column<string>(type: "text", nullable: false),
                    at = table.Column<Instant>(type: "timestamp with time zone", nullable: false),
                    recorded_at = table.Column<Instant>(type: "timestamp with time zone", nullable: false),
                    recorded_by = table.Column<string>(type: "text", nullable: false),
                    detail = table.Column<string>(type: "text", nullable: true)
                },
                constraints: table =>
                {
                    table.PrimaryKey("pk_episode_event", x => new { x.unit_id, x.id });
                    table.ForeignKey(
                        name: "fk_episode_event_episode_unit_id_episode_id",
                        columns: x => new { x.unit_id, x.episode_id },
                        principalTable: "episode",
                        principalColumns: new[] { "unit_id", "id" },
                        onDelete: ReferentialAction.Restrict);
                });

            migrationBuilder.CreateTable(
                name: "flag",
                columns: table => new
                {
                    unit_id = table.Column<Guid>(type: "uuid", nullable: false),
                    id = table.Column<Guid>(type: "uuid", nullable: false),
                    episode_id = table.Column<Guid>(type: "uuid", nullable: false),
                    rule = table.Column<string>(type: "text", nullable: false),
                    state = table.Column<string>(type: "text", nullable: false),
                    since = table.Column<Instant>(type: "timestamp with time zone", nullable: false),
                    closed_at = table.Column<Instant>(type: "timestamp with time zone", nullable: true),
                    finding = table.Column<string>(type: "jsonb", nullable: false),
                    in_hand = table.Column<string>(type: "jsonb", nullable: true)
                },
                constraints: table =>
                {
                    table.PrimaryKey("pk_flag", x => new { x.unit_id, x.id });
                    table.ForeignKey(
                        name: "fk_flag_episode_unit_id_episode_id",
                        columns: x => new { x.unit_id, x.episode_id },
                        principalTable: "episode",
                        principalColumns: new[] { "unit_id", "id" },
                        onDelete: ReferentialAction.Restrict);
                });

            migrationBuilder.CreateTable(
                name: "bed_stay",
                columns: table => new
                {
                    unit_id = table.Column<Guid>(type: "uuid", nullable: false),
                    id = table.Column<Guid>(type: "uuid", nullable: false),
                    episode_id = table.Column<Guid>(type: "uuid", nullable: false),
                    bed_id = table.Column<Guid>(type: "uuid", nullable: false),
                    from = table.Column<Instant>(type: "timestamp with time zone", nullable: false),
                    until = table.Column<Instant>(type: "timestamp with time zone", nullable: true)
                },
                constraints: table =>
                {
                    table.PrimaryKey("pk_bed_stay", x => new { x.unit_id, x.id });
                    table.ForeignKey(
                        name: "fk_bed_stay_bed_unit_id_bed_id",
                        columns: x => new { x.unit_id, x.bed_id },
                        principalTable: "bed",
                        principalColumns: new[] { "unit_id", "id" },
                        onDelete: ReferentialAction.Restrict);
                    table.ForeignKey(
                        name: "fk_bed_stay_episode_unit_id_episode_id",
                        columns: x => new { x.unit_id, x.episode_id },
                        principalTable: "episode",
                        principalColumns: new[] { "unit_id", "id" },
                        onDelete: ReferentialAction.Restrict);
                });

            migrationBuilder.CreateTable(
                name: "follow_up_step",
                columns: table => new
                {
                    unit_id = table.Column<Guid>(type: "uuid", nullable: false),
                    id = table.Column<Guid>(type: "uuid", nullable: false),
                    follow_up_id = table.Column<Guid>(type: "uuid", nullable: false),
                    step = table.Column<string>(type: "text", nullable: false),
                    at = table.Column<Instant>(type: "timestamp with time zone", nullable: false),
                    by = table.Column<string>(type: "text", nullable: false),
                    reason = table.Column<string>(type: "text", nullable: true),
                    for_role = table.Column<string>(type: "text", nullable: true)
                },
                constraints: table =>
                {
                    table.PrimaryKey("pk_follow_up_step", x => new { x.unit_id, x.id });
                    table.ForeignKey(
                        name: "fk_follow_up_step_entry_unit_id_follow_up_id",
                        columns: x => new { x.unit_id, x.follow_up_id },
                        principalTable: "entry",
                        principalColumns: new[] { "unit_id", "id" },
                        onDelete: ReferentialAction.Restrict);
                });

            migrationBuilder.CreateTable(
                name: "strike_out",
                columns: table => new
                {
                    unit_id = table.Column<Guid>(type: "uuid", nullable: false),
                    id = table.Column<Guid>(type: "uuid", nullable: false),
                    entry_id = table.Column<Guid>(type: "uuid", nullable: false),
                    at = table.Column<Instant>(type: "timestamp with time zone", nullable: false),
                    by = table.Column<string>(type: "text", nullable: false),
                    reason = table.Column<string>(type: "text", nullable: false)
                },
                constraints: table =>
                {
                    table.PrimaryKey("pk_strike_out", x => new { x.unit_id, x.id });
                    table.ForeignKey(
                        name: "fk_strike_out_entry_unit_id_entry_id",
                        columns: x => new { x.unit_id, x.entry_id },
                        principalTable: "entry",
                        principalColumns: new[] { "unit_id", "id" },
                        onDelete: ReferentialAction.Restrict);
                });

            migrationBuilder.CreateTable(
                name: "flag_event",
                columns: table => new
                {
                    unit_id = table.Column<Guid>(type: "uuid", nullable: false),
                    id = table.Column<Guid>(type: "uuid", nullable: false),
                    flag_id = table.Column<Guid>(type: "uuid", nullable: false),
                    kind = table.Column<string>(type: "text", nullable: false),
                    at = table.Column<Instant>(type: "timestamp with time zone", nullable: false),
                    by = table.Column<string>(type: "text", nullable: false),
                    finding = table.Column<string>(type: "jsonb", nullable: false),
                    in_hand = table.Column<string>(type: "jsonb", nullable: true)
                },
                constraints: table =>
                {
                    table.PrimaryKey("pk_flag_event", x => new { x.unit_id, x.id });
                    table.ForeignKey(
                        name: "fk_flag_event_flag_unit_id_flag_id",
                        columns: x => new { x.unit_id, x.flag_id },
                        principalTable: "flag",
                        principalColumns: new[] { "unit_id", "id" },
                        onDelete: ReferentialAction.Restrict);
                });

            migrationBuilder.CreateIndex(
                name: "EmailIndex",
                table: "account",
                column: "normalized_email");

            migrationBuilder.CreateIndex(
                name: "UserNameIndex",
                table: "account",
                column: "normalized_user_name",
                unique: true);

            migrationBuilder.CreateIndex(
                name: "ix_account_claim_user_id",
                table: "account_claim",
                column: "user_id");

            migrationBuilder.CreateIndex(
                name: "ix_account_login_user_id",
                table: "account_login",
                column: "user_id");

            migrationBuilder.CreateIndex(
                name: "ix_account_role_role_id",
                table: "account_role",
                column: "role_id");

            migrationBuilder.CreateIndex(
                name: "ix_api_token_hash",
                table: "api_token",
                column: "hash",
                unique: true);

            migrationBuilder.CreateIndex(
                name: "ix_api_token_unit_id",
                table: "api_token",
                column: "unit_id");

            migrationBuilder.CreateIndex(
                name: "ix_audit_event_unit_id_at",
                table: "audit_event",
                columns: new[] { "unit_id", "at" });

            migrationBuilder.CreateIndex(
                name: "ix_bed_unit_id_name",
                table: "bed",
                columns: new[] { "unit_id", "name" },
                unique: true);

            migrationBuilder.CreateIndex(
                name: "ix_bed_stay_one_patient_a_bed",
                table: "bed_stay",
                columns: new[] { "unit_id", "bed_id" },
                unique: true,
                filter: "until is null");

            migrationBuilder.CreateIndex(
                name: "ix_bed_stay_unit_id_episode_id",
                table: "bed_stay",
                columns: new[] { "unit_id", "episode_id" },
                unique: true,
                filter: "until is null");

            migrationBuilder.CreateIndex(
                name: "ix_bed_stay_unit_id_episode_id_from",
                table: "bed_stay",
                columns: new[] { "unit_id", "episode_id", "from" });

            migrationBuilder.CreateIndex(
                name: "ix_entry_id",
                table: "entry",
                column: "id",
                unique: true);

            migrationBuilder.CreateIndex(
                name: "ix_entry_unit_id_corrects",
                table: "entry",
                columns: new[] { "unit_id", "corrects" },
                unique: true,
                filter: "corrects is not null");

            migrationBuilder.CreateIndex(
                name: "ix_entry_unit_id_episode_id_effective_at_sequence",
                table: "entry",
                columns: new[] { "unit_id", "episode_id", "effective_at", "sequence" },
                descending: new[] { false, false, true, true });

            migrationBuilder.CreateIndex(
                name: "ix_entry_unit_id_episode_id_kind_effective_at_sequence",
                table: "entry",
                columns: new[] { "unit_id", "episode_id", "kind", "effective_at", "sequence" },
                descending: new[] { false, false, false, true, true });

            migrationBuilder.CreateIndex(
                name: "ix_episode_id",
                table: "episode",
                column: "id",
                unique: true);

            migrationBuilder.CreateIndex(
                name: "ix_episode_one_a_patient",
                table: "episode",
                columns: new[] { "unit_id", "patient_id" },
                unique: true,
                filter: "ended_at is null");

            migrationBuilder.CreateIndex(
                name: "ix_episode_unit_id_next_evaluation_at",
                table: "episode",
                columns: new[] { "unit_id", "next_evaluation_at" },
                filter: "ended_at is null");

            migrationBuilder.CreateIndex(
                name: "ix_episode_event_id",
                table: "episode_event",
                column: "id",
                unique: true);

            migrationBuilder.CreateIndex(
                name: "ix_episode_event_unit_id_episode_id",
                table: "episode_event",
                columns: new[] { "unit_id", "episode_id" });

            migrationBuilder.CreateIndex(
                name: "ix_flag_id",
                table: "flag",
                column: "id",
                unique: true);

            migrationBuilder.CreateIndex(
                name: "ix_flag_unit_id_episode_id_rule",
                table: "flag",
                columns: new[] { "unit_id", "episode_id", "rule" },
                unique: true,
                filter: "state = 'Open'");

            migrationBuilder.CreateIndex(
                name: "ix_flag_unit_id_episode_id_since",
                table: "flag",
                columns: new[] { "unit_id", "episode_id", "since" });

            migrationBuilder.CreateIndex(
                name: "ix_flag_event_id",
                table: "flag_event",
                column: "id",
                unique: true);

            migrationBuilder.CreateIndex(
                name: "ix_flag_event_unit_id_flag_id",
                table: "flag_event",
                columns: new[] { "unit_id", "flag_id" });

            migrationBuilder.CreateIndex(
                name: "ix_follow_up_step_id",
                table: "follow_up_step",
                column: "id",
                unique: true);

            migrationBuilder.CreateIndex(
                name: "ix_follow_up_step_unit_id_follow_up_id",
                table: "follow_up_step",
                columns: new[] { "unit_id", "follow_up_id" });

            migrationBuilder.CreateIndex(
                name: "ix_membership_user_id",
                table: "membership",
                column: "user_id");

            migrationBuilder.CreateIndex(
                name: "ix_patient_one_mrn_a_unit",
                table: "patient",
                columns: new[] { "unit_id", "mrn" },
                unique: true);

            migrationBuilder.CreateIndex(
                name: "ix_patient_fact_id",
                table: "patient_fact",
                column: "id",
                unique: true);

            migrationBuilder.CreateIndex(
                name: "ix_patient_fact_unit_id_patient_id",
                table: "patient_fact",
                columns: new[] { "unit_id", "patient_id" });

            migrationBuilder.CreateIndex(
                name: "RoleNameIndex",
                table: "role",
                column: "normalized_name",
                unique: true);

            migrationBuilder.CreateIndex(
                name: "ix_role_claim_role_id",
                table: "role_claim",
                column: "role_id");

            migrationBuilder.CreateIndex(
                name: "ix_strike_out_id",
                table: "strike_out",
                column: "id",
                unique: true);

            migrationBuilder.CreateIndex(
                name: "ix_strike_out_unit_id_entry_id",
                table: "strike_out",
                columns: new[] { "unit_id", "entry_id" },
                unique: true);

            migrationBuilder.CreateIndex(
                name: "ix_unit_code",
                table: "unit",
                column: "code",
                unique: true);

            migrationBuilder.Sql(SchemaSql.Protection);
        }

        /// <inheritdoc />
        protected override void Down(MigrationBuilder migrationBuilder)
        {
            migrationBuilder.DropTable(
                name: "account_claim");

            migrationBuilder.DropTable(
                name: "account_login");

            migrationBuilder.DropTable(
                name: "account_role");

            migrationBuilder.DropTable(
                name: "account_token");

            migrationBuilder.DropTable(
                name: "api_token");

            migrationBuilder.DropTable(
                name: "audit_event");

            migrationBuilder.DropTable(
                name: "bed_stay");

            migrationBuilder.DropTable(
                name: "data_protection_keys");

            migrationBuilder.DropTable(
                name: "episode_event");

            migrationBuilder.DropTable(
                name: "flag_event");

            migrationBuilder.DropTable(
                name: "follow_up_step");

            migrationBuilder.DropTable(
                name: "membership");

            migrationBuilder.DropTable(
                name: "patient_fact");

            migrationBuilder.DropTable(
                name: "role_claim");

            migrationBuilder.DropTable(
                name: "set_up");

            migrationBuilder.DropTable(
                name: "strike_out");

            migrationBuilder.DropTable(
                name: "unit_lookup");

            migrationBuilder.DropTable(
                name: "bed");

            migrationBuilder.DropTable(
                name: "flag");

            migrationBuilder.DropTable(
                name: "account");

            migrationBuilder.DropTable(
                name: "role");

            migrationBuilder.DropTable(
                name: "entry");

            migrationBuilder.DropTable(
                name: "unit");

            migrationBuilder.DropTable(
                name: "episode");

            migrationBuilder.DropTable(
                name: "patient");
        }
    }
}

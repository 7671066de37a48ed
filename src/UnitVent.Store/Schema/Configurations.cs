using Microsoft.EntityFrameworkCore;
using Microsoft.EntityFrameworkCore.Metadata.Builders;
using Npgsql.EntityFrameworkCore.PostgreSQL.Metadata;
using UnitVent.Store.Model;

namespace UnitVent.Store.Schema;

internal sealed class UnitConfiguration : IEntityTypeConfiguration<UnitRow>
{
    public void Configure(EntityTypeBuilder<UnitRow> builder)
    {
        builder.ToTable("unit");
        builder.HasIndex(u => u.Code).IsUnique();
        builder.Property(u => u.Version).IsRowVersion();
    }
}

internal sealed class BedConfiguration : IEntityTypeConfiguration<BedRow>
{
    public void Configure(EntityTypeBuilder<BedRow> builder)
    {
        builder.ToTable("bed").HasKey(b => new { b.UnitId, b.Id });
        builder.HasIndex(b => new { b.UnitId, b.Name }).IsUnique();
        builder.HasOne<UnitRow>().WithMany().HasForeignKey(b => b.UnitId).OnDelete(DeleteBehavior.Restrict);
    }
}

internal sealed class PatientConfiguration : IEntityTypeConfiguration<PatientRow>
{
    public const string OneMrnAUnit = "ix_patient_one_mrn_a_unit";

    public void Configure(EntityTypeBuilder<PatientRow> builder)
    {
        builder.ToTable("patient").HasKey(p => new { p.UnitId, p.Id });
        builder.HasIndex(p => new { p.UnitId, p.Mrn }).IsUnique().HasDatabaseName(OneMrnAUnit);
        builder.Property(p => p.Facts).HasColumnType("jsonb");
        builder.Property(p => p.Version).IsRowVersion();
    }
}

internal sealed class PatientFactConfiguration : IEntityTypeConfiguration<PatientFactRow>
{
    public void Configure(EntityTypeBuilder<PatientFactRow> builder)
    {
        builder.ToTable("patient_fact").HasKey(f => new { f.UnitId, f.Id });
        builder.HasIndex(f => f.Id).IsUnique();
        builder.Property(f => f.Facts).HasColumnType("jsonb");
        builder.HasOne<PatientRow>().WithMany().HasForeignKey(f => new { f.UnitId, f.PatientId }).OnDelete(DeleteBehavior.Restrict);
    }
}

internal sealed class EpisodeConfiguration : IEntityTypeConfiguration<EpisodeRow>
{
    public const string OneEpisodeAPatient = "ix_episode_one_a_patient";

    public void Configure(EntityTypeBuilder<EpisodeRow> builder)
    {
        builder.ToTable("episode").HasKey(e => new { e.UnitId, e.Id });
        builder.HasIndex(e => e.Id).IsUnique();
        builder.HasIndex(e => new { e.UnitId, e.PatientId }).HasFilter("ended_at is null").IsUnique().HasDatabaseName(OneEpisodeAPatient);
        builder.HasIndex(e => new { e.UnitId, e.NextEvaluationAt }).HasFilter("ended_at is null");
        builder.HasOne<PatientRow>().WithMany().HasForeignKey(e => new { e.UnitId, e.PatientId }).OnDelete(DeleteBehavior.Restrict);
    }
}

internal sealed class BedStayConfiguration : IEntityTypeConfiguration<BedStayRow>
{
    public const string OnePatientABed = "ix_bed_stay_one_patient_a_bed";

    public void Configure(EntityTypeBuilder<BedStayRow> builder)
    {
        builder.ToTable("bed_stay").HasKey(s => new { s.UnitId, s.Id });
        builder.HasIndex(s => new { s.UnitId, s.BedId }, "one_bed").HasFilter("until is null").IsUnique().HasDatabaseName(OnePatientABed);
        builder.HasIndex(s => new { s.UnitId, s.EpisodeId }, "one_episode").HasFilter("until is null").IsUnique();
        builder.HasIndex(s => new { s.UnitId, s.EpisodeId, s.From }, "history");
        builder.HasOne<EpisodeRow>().WithMany().HasForeignKey(s => new { s.UnitId, s.EpisodeId }).OnDelete(DeleteBehavior.Restrict);
        builder.HasOne<BedRow>().WithMany().HasForeignKey(s => new { s.UnitId, s.BedId }).OnDelete(DeleteBehavior.Restrict);
    }
}

internal sealed class EpisodeEventConfiguration : IEntityTypeConfiguration<EpisodeEventRow>
{
    public void Configure(EntityTypeBuilder<EpisodeEventRow> builder)
    {
        builder.ToTable("episode_event").HasKey(e => new { e.UnitId, e.Id });
        builder.HasIndex(e => e.Id).IsUnique();
        builder.HasOne<EpisodeRow>().WithMany().HasForeignKey(e => new { e.UnitId, e.EpisodeId }).OnDelete(DeleteBehavior.Restrict);
    }
}

internal sealed class EntryConfiguration : IEntityTypeConfiguration<EntryRow>
{
    public void Configure(EntityTypeBuilder<EntryRow> builder)
    {
        builder.ToTable("entry").HasKey(e => new { e.UnitId, e.Id });
        builder.HasIndex(e => e.Id).IsUnique();
        builder.Property(e => e.Sequence).UseIdentityAlwaysColumn();
        builder.Property(e => e.Body).HasColumnType("jsonb");
        builder.HasIndex(e => new { e.UnitId, e.EpisodeId, e.EffectiveAt, e.Sequence }).IsDescending(false, false, true, true);
        builder.HasIndex(e => new { e.UnitId, e.EpisodeId, e.Kind, e.EffectiveAt, e.Sequence }).IsDescending(false, false, false, true, true);
        builder.HasIndex(e => new { e.UnitId, e.Corrects }).HasFilter("corrects is not null").IsUnique();
        builder.HasOne<EpisodeRow>().WithMany().HasForeignKey(e => new { e.UnitId, e.EpisodeId }).OnDelete(DeleteBehavior.Restrict);
        builder.HasOne<EntryRow>().WithMany().HasForeignKey(e => new { e.UnitId, e.Corrects }).OnDelete(DeleteBehavior.Restrict);
    }
}

internal sealed class StrikeOutConfiguration : IEntityTypeConfiguration<StrikeOutRow>
{
    public void Configure(EntityTypeBuilder<StrikeOutRow> builder)
    {
        builder.ToTable("strike_out").HasKey(s => new { s.UnitId, s.Id });
        builder.HasIndex(s => s.Id).IsUnique();
        builder.HasIndex(s => new { s.UnitId, s.EntryId }).IsUnique();
        builder.HasOne<EntryRow>().WithMany().HasForeignKey(s => new { s.UnitId, s.EntryId }).OnDelete(DeleteBehavior.Restrict);
    }
}

internal sealed class FollowUpStepConfiguration : IEntityTypeConfiguration<FollowUpStepRow>
{
    public void Configure(EntityTypeBuilder<FollowUpStepRow> builder)
    {
        builder.ToTable("follow_up_step").HasKey(s => new { s.UnitId, s.Id });
        builder.HasIndex(s => s.Id).IsUnique();
        builder.HasIndex(s => new { s.UnitId, s.FollowUpId });
        builder.HasOne<EntryRow>().WithMany().HasForeignKey(s => new { s.UnitId, s.FollowUpId }).OnDelete(DeleteBehavior.Restrict);
    }
}

internal sealed class FlagConfiguration : IEntityTypeConfiguration<FlagRow>
{
    public void Configure(EntityTypeBuilder<FlagRow> builder)
    {
        builder.ToTable("flag").HasKey(f => new { f.UnitId, f.Id });
        builder.HasIndex(f => f.Id).IsUnique();
        builder.HasIndex(f => new { f.UnitId, f.EpisodeId, f.Rule }, "one_open").HasFilter("state = 'Open'").IsUnique();
        builder.HasIndex(f => new { f.UnitId, f.EpisodeId, f.Since }, "history");
        builder.Property(f => f.Finding).HasColumnType("jsonb");
        builder.Property(f => f.InHand).HasColumnType("jsonb");
        builder.HasOne<EpisodeRow>().WithMany().HasForeignKey(f => new { f.UnitId, f.EpisodeId }).OnDelete(DeleteBehavior.Restrict);
    }
}

internal sealed class FlagEventConfiguration : IEntityTypeConfiguration<FlagEventRow>
{
    public void Configure(EntityTypeBuilder<FlagEventRow> builder)
    {
        builder.ToTable("flag_event").HasKey(e => new { e.UnitId, e.Id });
        builder.HasIndex(e => e.Id).IsUnique();
        builder.HasIndex(e => new { e.UnitId, e.FlagId });
        builder.Property(e => e.Finding).HasColumnType("jsonb");
        builder.Property(e => e.InHand).HasColumnType("jsonb");
        builder.HasOne<FlagRow>().WithMany().HasForeignKey(e => new { e.UnitId, e.FlagId }).OnDelete(DeleteBehavior.Restrict);
    }
}

internal sealed class AuditEventConfiguration : IEntityTypeConfiguration<AuditEventRow>
{
    public void Configure(EntityTypeBuilder<AuditEventRow> builder)
    {
        builder.ToTable("audit_event").HasKey(e => new { e.UnitId, e.Number });
        builder.Property(e => e.Number).ValueGeneratedOnAdd().Metadata.SetValueGenerationStrategy(NpgsqlValueGenerationStrategy.None);
        builder.Property(e => e.PreviousHash).ValueGeneratedOnAdd();
        builder.Property(e => e.Hash).ValueGeneratedOnAdd();
        builder.HasIndex(e => new { e.UnitId, e.At });
    }
}

internal sealed class UnitLookupConfiguration : IEntityTypeConfiguration<UnitLookupRow>
{
    public void Configure(EntityTypeBuilder<UnitLookupRow> builder) => builder.ToTable("unit_lookup").HasKey(l => l.Id);
}

internal sealed class MembershipConfiguration : IEntityTypeConfiguration<MembershipRow>
{
    public void Configure(EntityTypeBuilder<MembershipRow> builder)
    {
        builder.ToTable("membership").HasKey(m => new { m.UnitId, m.UserId });
        builder.HasIndex(m => m.UserId);
        builder.HasOne<UnitRow>().WithMany().HasForeignKey(m => m.UnitId).OnDelete(DeleteBehavior.Restrict);
        builder.HasOne<People.Account>().WithMany().HasForeignKey(m => m.UserId).OnDelete(DeleteBehavior.Restrict);
    }
}

internal sealed class ApiTokenConfiguration : IEntityTypeConfiguration<ApiTokenRow>
{
    public void Configure(EntityTypeBuilder<ApiTokenRow> builder)
    {
        builder.ToTable("api_token");
        builder.HasIndex(t => t.Hash).IsUnique();
        builder.HasOne<UnitRow>().WithMany().HasForeignKey(t => t.UnitId).OnDelete(DeleteBehavior.Restrict);
    }
}

internal sealed class SetUpConfiguration : IEntityTypeConfiguration<SetUpRow>
{
    public void Configure(EntityTypeBuilder<SetUpRow> builder)
    {
        builder.ToTable("set_up");
        builder.Property(s => s.Id).ValueGeneratedNever();
    }
}

internal sealed class ThresholdVersionConfiguration : IEntityTypeConfiguration<ThresholdVersionRow>
{
    public void Configure(EntityTypeBuilder<ThresholdVersionRow> builder)
    {
        builder.ToTable("threshold_version").HasKey(v => new { v.UnitId, v.Id });
        builder.HasIndex(v => new { v.UnitId, v.At });
        builder.Property(v => v.Chosen).HasColumnType("jsonb");
        builder.HasOne<UnitRow>().WithMany().HasForeignKey(v => v.UnitId).OnDelete(DeleteBehavior.Restrict);
    }
}

internal sealed class ThresholdAnswerConfiguration : IEntityTypeConfiguration<ThresholdAnswerRow>
{
    public void Configure(EntityTypeBuilder<ThresholdAnswerRow> builder)
    {
        builder.ToTable("threshold_answer").HasKey(a => new { a.UnitId, a.VersionId });
        builder.HasOne<ThresholdVersionRow>().WithMany().HasForeignKey(a => new { a.UnitId, a.VersionId }).OnDelete(DeleteBehavior.Restrict);
    }
}

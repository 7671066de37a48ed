using Microsoft.AspNetCore.DataProtection.EntityFrameworkCore;
using Microsoft.AspNetCore.Identity;
using Microsoft.AspNetCore.Identity.EntityFrameworkCore;
using Microsoft.EntityFrameworkCore;
using UnitVent.Store.Model;
using UnitVent.Store.People;

namespace UnitVent.Store.Schema;

internal sealed class UnitVentDbContext(DbContextOptions<UnitVentDbContext> options)
    : IdentityDbContext<Account, IdentityRole<Guid>, Guid>(options), IDataProtectionKeyContext
{
    public DbSet<UnitRow> Units => Set<UnitRow>();

    public DbSet<BedRow> Beds => Set<BedRow>();

    public DbSet<PatientRow> Patients => Set<PatientRow>();

    public DbSet<PatientFactRow> PatientFacts => Set<PatientFactRow>();

    public DbSet<EpisodeRow> Episodes => Set<EpisodeRow>();

    public DbSet<BedStayRow> BedStays => Set<BedStayRow>();

    public DbSet<EpisodeEventRow> EpisodeEvents => Set<EpisodeEventRow>();

    public DbSet<EntryRow> Entries => Set<EntryRow>();

    public DbSet<StrikeOutRow> StrikeOuts => Set<StrikeOutRow>();

    public DbSet<FollowUpStepRow> FollowUpSteps => Set<FollowUpStepRow>();

    public DbSet<FlagRow> Flags => Set<FlagRow>();

    public DbSet<FlagEventRow> FlagEvents => Set<FlagEventRow>();

    public DbSet<AuditEventRow> AuditEvents => Set<AuditEventRow>();

    public DbSet<ThresholdVersionRow> ThresholdVersions => Set<ThresholdVersionRow>();

    public DbSet<ThresholdAnswerRow> ThresholdAnswers => Set<ThresholdAnswerRow>();

    public DbSet<UnitLookupRow> UnitLookups => Set<UnitLookupRow>();

    public DbSet<MembershipRow> Memberships => Set<MembershipRow>();

    public DbSet<ApiTokenRow> ApiTokens => Set<ApiTokenRow>();

    public DbSet<SetUpRow> SetUps => Set<SetUpRow>();

    public DbSet<DataProtectionKey> DataProtectionKeys => Set<DataProtectionKey>();

    protected override void OnModelCreating(ModelBuilder builder)
    {
        base.OnModelCreating(builder);
        builder.ApplyConfigurationsFromAssembly(typeof(UnitVentDbContext).Assembly);
        NamePeople(builder);
    }

    protected override void ConfigureConventions(ModelConfigurationBuilder configurationBuilder)
    {
        configurationBuilder.Properties<Enum>().HaveConversion<string>();
    }

    // Identity names its tables itself, past the naming convention.
    private static void NamePeople(ModelBuilder builder)
    {
        builder.Entity<Account>().ToTable("account");
        builder.Entity<IdentityUserClaim<Guid>>().ToTable("account_claim");
        builder.Entity<IdentityUserLogin<Guid>>().ToTable("account_login");
        builder.Entity<IdentityUserToken<Guid>>().ToTable("account_token");
        builder.Entity<IdentityUserRole<Guid>>().ToTable("account_role");
        builder.Entity<IdentityRole<Guid>>().ToTable("role");
        builder.Entity<IdentityRoleClaim<Guid>>().ToTable("role_claim");
    }
}

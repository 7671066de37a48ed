using Microsoft.AspNetCore.DataProtection;
using Microsoft.AspNetCore.Identity;
using Microsoft.Extensions.DependencyInjection;
using Microsoft.Extensions.Logging;
using NodaTime;
using UnitVent.Store.Auditing;
using UnitVent.Store.Episodes;
using UnitVent.Store.Flags;
using UnitVent.Store.Live;
using UnitVent.Store.People;
using UnitVent.Store.Reading;
using UnitVent.Store.Recording;
using UnitVent.Store.Schema;
using UnitVent.Store.Units;

namespace UnitVent.Store;

/// <summary>Registers the store.</summary>
public static class StoreRegistration
{
    private const int ShortestPassword = 15; // NIST SP 800-63B: passwords alone
    private const int HashIterations = 210_000; // OWASP ASVS 5.0, 11.4.2: PBKDF2-HMAC-SHA-512
    private const int TriesBeforeLockout = 10;

    private static readonly TimeSpan LockedFor = TimeSpan.FromMinutes(1);

    /// <summary>Registers everything that reads and writes the store, and the background services that keep it alive.</summary>
    /// <param name="services">The services; a <see cref="IClock"/> must be among them.</param>
    /// <param name="runtimeConnectionString">The way in for the program at work.</param>
    /// <returns>Identity's builder, for sign-in.</returns>
    public static IdentityBuilder AddUnitVentStore(this IServiceCollection services, string runtimeConnectionString)
    {
        services.AddSingleton(_ => ContextOptions.DataSource(runtimeConnectionString));
        services.AddDbContextFactory<UnitVentDbContext>((provider, builder) => ContextOptions.Configure(builder, provider.GetRequiredService<Npgsql.NpgsqlDataSource>()));
        services.AddSingleton<UnitScope>();
        services.AddSingleton(p => new ChangeFeed(runtimeConnectionString, p.GetRequiredService<ILogger<ChangeFeed>>()));
        services.AddHostedService(p => p.GetRequiredService<ChangeFeed>());
        services.AddSingleton<DueEvaluator>();
        services.AddHostedService(p => p.GetRequiredService<DueEvaluator>());
        AddDesks(services);
        services.AddDataProtection().SetApplicationName("UnitVent").PersistKeysToDbContext<UnitVentDbContext>();
        services.Configure<PasswordHasherOptions>(o => o.IterationCount = HashIterations);
        return services.AddIdentityCore<Account>(Options).AddEntityFrameworkStores<UnitVentDbContext>().AddSignInManager().AddDefaultTokenProviders();
    }

    private static void AddDesks(IServiceCollection services)
    {
        services.AddSingleton(p => new ChartRecorder(Scope(p), Clock(p)));
        services.AddSingleton(p => new EpisodeDesk(Scope(p), Clock(p)));
        services.AddSingleton(p => new FlagDesk(Scope(p), Clock(p)));
        services.AddSingleton(p => new ChartReader(Scope(p), Clock(p)));
        services.AddSingleton(p => new UnitBoards(Scope(p), p.GetRequiredService<ChangeFeed>(), Clock(p)));
        services.AddSingleton(p => new AuditTrail(Scope(p), Clock(p)));
        services.AddSingleton(p => new TokenDesk(Scope(p), Clock(p)));
        services.AddSingleton(p => new UnitDesk(Scope(p), Clock(p)));
        services.AddSingleton(p => new ThresholdDesk(Scope(p), Clock(p)));
        services.AddSingleton(p => new UserDesk(p.GetRequiredService<IServiceScopeFactory>(), Scope(p), Clock(p)));
        services.AddSingleton(p => new SetUpDesk(p.GetRequiredService<IServiceScopeFactory>(), Scope(p), Clock(p)));
    }

    private static void Options(IdentityOptions options)
    {
        options.Password.RequiredLength = ShortestPassword;
        options.Password.RequireDigit = false;
        options.Password.RequireLowercase = false;
        options.Password.RequireUppercase = false;
        options.Password.RequireNonAlphanumeric = false;
        options.Lockout.MaxFailedAccessAttempts = TriesBeforeLockout;
        options.Lockout.DefaultLockoutTimeSpan = LockedFor;
        options.User.AllowedUserNameCharacters = "abcdefghijklmnopqrstuvwxyzABCDEFGHIJKLMNOPQRSTUVWXYZ0123456789-._@+";
    }

    private static UnitScope Scope(IServiceProvider provider) => provider.GetRequiredService<UnitScope>();

    private static IClock Clock(IServiceProvider provider) => provider.GetRequiredService<IClock>();
}

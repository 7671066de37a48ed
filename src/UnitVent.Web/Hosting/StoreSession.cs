using NodaTime;
using UnitVent.Store;

namespace UnitVent.Web.Hosting;

/// <summary>The store, open for one verb of the command line; it works beside a program that serves from the same data folder.</summary>
public sealed class StoreSession : IAsyncDisposable
{
    private readonly Database database;
    private readonly ServiceProvider services;

    private StoreSession(Database database, ServiceProvider services) => (this.database, this.services) = (database, services);

    public static async Task<StoreSession> OpenAsync(CancellationToken cancel)
    {
        var settings = HostSettings.From(new ConfigurationBuilder().AddEnvironmentVariables().Build());
        var database = await Database.OpenAsync(settings, cancel);
        try
        {
            await database.MigrateAsync(cancel);
            return new StoreSession(database, Services(database.RuntimeConnection, MachineClock.Clock));
        }
        catch
        {
            await database.DisposeAsync();
            throw;
        }
    }

    /// <summary>The store's desks with a clock of their own and no background services.</summary>
    public static ServiceProvider Services(string connection, IClock clock)
    {
        var services = new ServiceCollection();
        services.AddLogging();
        services.AddSingleton(clock);
        services.AddUnitVentStore(connection);
        return services.BuildServiceProvider();
    }

    public Database Database => database;

    public T Desk<T>()
        where T : notnull => services.GetRequiredService<T>();

    public async ValueTask DisposeAsync()
    {
        await services.DisposeAsync();
        await database.DisposeAsync();
    }
}

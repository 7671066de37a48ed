using Microsoft.EntityFrameworkCore;
using Microsoft.EntityFrameworkCore.Design;

namespace UnitVent.Store.Schema;

/// <summary>Lets the migration tool make a context; it connects to nothing.</summary>
internal sealed class DesignTimeContextFactory : IDesignTimeDbContextFactory<UnitVentDbContext>
{
    public UnitVentDbContext CreateDbContext(string[] args)
    {
        var options = new DbContextOptionsBuilder<UnitVentDbContext>();
        ContextOptions.Configure(options, ContextOptions.DataSource("Host=127.0.0.1;Database=unitvent"));
        return new UnitVentDbContext(options.Options);
    }
}

using System.Reflection;

namespace UnitVent.Store.Schema;

/// <summary>The hand-written parts of the schema.</summary>
internal static class SchemaSql
{
    public static string Protection => Read("protection.sql");

    public static string GrantsTo(string role) => Read("grants.sql").Replace("{role}", role.Replace("'", "''", StringComparison.Ordinal), StringComparison.Ordinal);

    /// <summary>What a table that comes later needs: append-only, and its rows seen within their unit only.</summary>
    public static string Protect(string table) => $"""
        create trigger {table}_append_only before update or delete on {table} for each row execute function refuse_change();
        create trigger {table}_no_truncate before truncate on {table} for each statement execute function refuse_change();
        alter table {table} enable row level security;
        alter table {table} force row level security;
        create policy unit_scope on {table} using (unit_id = (select unit_in_scope())) with check (unit_id = (select unit_in_scope()));
        """;

    private static string Read(string file)
    {
        using var stream = Assembly.GetExecutingAssembly().GetManifestResourceStream("UnitVent.Store.Schema." + file)
            ?? throw new InvalidOperationException($"{file} is not embedded.");
        using var reader = new StreamReader(stream);
        return reader.ReadToEnd();
    }
}

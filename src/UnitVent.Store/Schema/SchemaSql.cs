using System.Reflection;

namespace UnitVent.Store.Schema;

/// <summary>The hand-written parts of the schema.</summary>
internal static class SchemaSql
{
    public static string Protection => Read("protection.sql");

    public static string GrantsTo(string role) => Read("grants.sql").Replace("{role}", role.Replace("'", "''", StringComparison.Ordinal), StringComparison.Ordinal);

    private static string Read(string file)
    {
        using var stream = Assembly.GetExecutingAssembly().GetManifestResourceStream("UnitVent.Store.Schema." + file)
            ?? throw new InvalidOperationException($"{file} is not embedded.");
        using var reader = new StreamReader(stream);
        return reader.ReadToEnd();
    }
}

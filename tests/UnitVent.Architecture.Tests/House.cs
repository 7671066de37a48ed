using System.Reflection;

namespace UnitVent.Architecture.Tests;

/// <summary>The projects as built, and the checkout they were built from.</summary>
internal static class House
{
    public static Assembly Physiology { get; } = typeof(UnitVent.Physiology.PartialPressure).Assembly;

    public static Assembly Charting { get; } = typeof(UnitVent.Charting.Entries.Entry).Assembly;

    public static Assembly Handover { get; } = Assembly.Load("UnitVent.Handover");

    public static Assembly Store { get; } = Assembly.Load("UnitVent.Store");

    public static Assembly Simulation { get; } = Assembly.Load("UnitVent.Simulation");

    public static Assembly Web { get; } = typeof(Program).Assembly;

    public static IReadOnlyList<Assembly> All { get; } = [Physiology, Charting, Handover, Store, Simulation, Web];

    public static string Root { get; } = FindRoot();

    /// <summary>Names of the assemblies that an assembly refers to in what it compiled to.</summary>
    public static IEnumerable<string> ReferencesOf(Assembly assembly) => assembly.GetReferencedAssemblies().Select(r => r.Name!);

    /// <summary>Paths of the files that people wrote, relative to the root.</summary>
    public static IEnumerable<string> Files(string folder, params string[] endings) =>
        Directory.EnumerateFiles(Path.Combine(Root, folder), "*", SearchOption.AllDirectories)
            .Select(f => Path.GetRelativePath(Root, f))
            .Where(f => endings.Any(e => f.EndsWith(e, StringComparison.Ordinal)))
            .Where(f => !f.Split(Path.DirectorySeparatorChar).Any(p => p is "bin" or "obj" or "Migrations"));

    private static string FindRoot()
    {
        var folder = new DirectoryInfo(AppContext.BaseDirectory);
        while (folder is not null && !File.Exists(Path.Combine(folder.FullName, "UnitVent.sln")))
        {
            folder = folder.Parent;
        }

        return folder?.FullName ?? throw new InvalidOperationException("The tests do not run inside a checkout.");
    }
}

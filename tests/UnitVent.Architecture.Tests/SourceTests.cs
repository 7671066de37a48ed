using System.Text.RegularExpressions;

namespace UnitVent.Architecture.Tests;

/// <summary>What the text of the source has to keep to.</summary>
public sealed partial class SourceTests
{
    private const int MostLines = 400;

    [Fact]
    public void Files_StayShort()
    {
        var files = House.Files("src", ".cs", ".razor", ".css", ".js").Concat(House.Files("tests", ".cs", ".razor"));
        var tooLong = files.Select(f => (File: f, Lines: File.ReadLines(Path.Combine(House.Root, f)).Count())).Where(f => f.Lines > MostLines);
        Assert.Empty(tooLong);
    }

    [Fact]
    public void Clock_IsReadFromTheMachineOnlyAtStartUp()
    {
        var ambient = House.Files("src", ".cs", ".razor").Where(f => AmbientClock().IsMatch(File.ReadAllText(Path.Combine(House.Root, f))));
        Assert.Equal(["src/UnitVent.Web/Hosting/MachineClock.cs"], ambient);
    }

    [Fact]
    public void Types_SayWhatTheyAre() =>
        Assert.DoesNotContain(House.All.SelectMany(a => a.GetTypes()).Where(Ours), t => VagueName().IsMatch(t.Name));

    private static bool Ours(Type type) => type.Namespace?.StartsWith("UnitVent", StringComparison.Ordinal) is true;

    [GeneratedRegex(@"\bDateTime(Offset)?\.(Now|UtcNow|Today)\b|\bSystemClock\.Instance\b|\bTimeProvider\.System\b", RegexOptions.NonBacktracking)]
    private static partial Regex AmbientClock();

    [GeneratedRegex("(Helpers?|Utils?|Utilit(y|ies)|Managers?)$", RegexOptions.NonBacktracking)]
    private static partial Regex VagueName();
}

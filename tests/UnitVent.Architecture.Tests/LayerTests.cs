using System.Reflection;

namespace UnitVent.Architecture.Tests;

/// <summary>Arrows point down only: who may know whom, as <c>DEVELOPERS.md</c> draws it.</summary>
public sealed class LayerTests
{
    public static TheoryData<string, string[]> HouseArrows => new()
    {
        { "UnitVent.Physiology", [] },
        { "UnitVent.Charting", ["UnitVent.Physiology"] },
        { "UnitVent.Handover", ["UnitVent.Charting"] },
        { "UnitVent.Simulation", ["UnitVent.Charting", "UnitVent.Physiology"] },
        { "UnitVent.Store", ["UnitVent.Charting"] },
        { "unitvent", ["UnitVent.Charting", "UnitVent.Handover", "UnitVent.Physiology", "UnitVent.Simulation", "UnitVent.Store"] },
    };

    [Theory]
    [MemberData(nameof(HouseArrows))]
    public void Project_RefersOnlyToProjectsBelow(string project, string[] below)
    {
        var known = House.ReferencesOf(Assembly.Load(project)).Where(r => r.StartsWith("UnitVent.", StringComparison.Ordinal));
        Assert.Empty(known.Except(below));
    }

    [Fact]
    public void Physiology_RefersOnlyToTheBaseLibrary() =>
        Assert.All(House.ReferencesOf(House.Physiology), r => Assert.StartsWith("System.", r, StringComparison.Ordinal));

    [Fact]
    public void Charting_RefersOnlyToTimeAndNumerics() =>
        Assert.Empty(House.ReferencesOf(House.Charting)
            .Where(r => !r.StartsWith("System.", StringComparison.Ordinal))
            .Except(["NodaTime", "MathNet.Numerics", "UnitVent.Physiology"]));

    [Fact]
    public void Database_IsKnownToStoreAlone() =>
        Assert.All(House.All.Where(a => a != House.Store), a => Assert.DoesNotContain(House.ReferencesOf(a), IsDatabase));

    [Fact]
    public void Simulation_IsKnownToTheDemonstrationAlone()
    {
        var users = NetArchTest.Rules.Types.InAssembly(House.Web).That().HaveDependencyOn("UnitVent.Simulation").GetTypes().Select(t => t.FullName!);
        Assert.All(users, u => Assert.StartsWith("UnitVent.Web.Hosting.Demo", u, StringComparison.Ordinal));
    }

    private static bool IsDatabase(string reference) =>
        reference.StartsWith("Npgsql", StringComparison.Ordinal) || reference.Contains("EntityFrameworkCore", StringComparison.Ordinal);
}

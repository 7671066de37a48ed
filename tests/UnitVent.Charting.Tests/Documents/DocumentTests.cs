using System.Runtime.CompilerServices;
using UnitVent.Charting.Pictures;

namespace UnitVent.Charting.Tests.Documents;

/// <summary>What is written from the code stands in docs as the code has it.</summary>
public sealed class DocumentTests
{
    [Fact]
    public void Equations_InTheDocument_AreThoseOfTheCode() => AssertCurrent("equations.md", EquationSheet.Text());

    [Fact]
    public void Rules_InTheDocument_AreThoseOfTheCode() => AssertCurrent("rules.md", RuleSheet.Text());

    [Fact]
    public void FurtherEquations_NameAMemberThatIsThere() => Assert.All(FurtherEquations.All, further =>
    {
        var (type, member) = (further.Code.Split('.')[0], further.Code.Split('.')[1]);
        var found = typeof(Physiology.AirwayPressure).Assembly.GetExportedTypes().Concat(typeof(PatientPicture).Assembly.GetExportedTypes()).Single(t => t.Name == type);
        Assert.NotEmpty(found.GetMember(member));
    });

    private static void AssertCurrent(string name, string text, [CallerFilePath] string here = "")
    {
        var path = Path.GetFullPath(Path.Combine(Path.GetDirectoryName(here)!, "../../../docs", name));
        if (Environment.GetEnvironmentVariable("UNITVENT_WRITE_DOCS") == "1")
        {
            File.WriteAllText(path, text);
        }

        Assert.Equal(text, File.ReadAllText(path));
    }
}

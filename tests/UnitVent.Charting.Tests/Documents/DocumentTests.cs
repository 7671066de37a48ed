using System.Runtime.CompilerServices;

namespace UnitVent.Charting.Tests.Documents;

/// <summary>What is written from the code stands in docs as the code has it.</summary>
public sealed class DocumentTests
{
    [Fact]
    public void Equations_InTheDocument_AreThoseOfTheCode() => AssertCurrent("equations.md", EquationSheet.Text());

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

using NodaTime;

namespace UnitVent.Simulation.Tests.Demo;

/// <summary>A seed file that cannot be told is refused with its name and the reason.</summary>
public sealed class SeedFileTests : IDisposable
{
    private readonly string folder = Directory.CreateTempSubdirectory("demo-seed").FullName;

    public void Dispose() => Directory.Delete(folder, recursive: true);

    [Fact]
    public void Create_FromSoundFiles_TellsThem() => Assert.Single(Create("\"fromHour\": 78", "\"fromHour\": 78").Episodes);

    [Theory]
    [InlineData("\"hour\": 0.1", "\"hour\": 3", "no settings within the first hour")]
    [InlineData("\"everyHours\": 36", "\"everyHours\": 20", "has to lie between")]
    [InlineData("{ \"hour\": 89, \"value\": 0.35 }", "{ \"hour\": 82, \"value\": 0.35 }", "have to rise")]
    [InlineData("{ \"hour\": 114, \"value\": 0.24 }", "{ \"hour\": 114, \"value\": 0.30 }", "has to be back")]
    [InlineData("\"story\"", "\"tale\"", "tale")]
    public void Create_FromAFaultyFile_SaysWhichAndWhy(string sound, string faulty, string says)
    {
        var refusal = Assert.Throws<InvalidDataException>(() => Create(sound, faulty));

        Assert.Contains("02-farnwedel.json", refusal.Message, StringComparison.Ordinal);
        Assert.Contains(says, refusal.Message, StringComparison.Ordinal);
    }

    private SimulatedUnit Create(string sound, string faulty)
    {
        Directory.CreateDirectory(Path.Combine(folder, "patients"));
        File.Copy(Path.Combine(Demonstration.SeedFolder, "unit.json"), Path.Combine(folder, "unit.json"));
        var text = File.ReadAllText(Path.Combine(Demonstration.SeedFolder, "patients", "02-farnwedel.json"));
        Assert.Contains(sound, text, StringComparison.Ordinal);
        File.WriteAllText(Path.Combine(folder, "patients", "02-farnwedel.json"), text.Replace(sound, faulty, StringComparison.Ordinal));
        return DemoUnit.Create(folder, Demonstration.Origin, Demonstration.Origin + Duration.FromHours(1));
    }
}

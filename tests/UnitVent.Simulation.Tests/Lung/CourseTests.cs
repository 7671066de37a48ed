using UnitVent.Simulation.Lung;

namespace UnitVent.Simulation.Tests.Lung;

public sealed class CourseTests
{
    private static readonly Keyframe[] Track = [new(10, 0.2), new(20, 0.4)];

    [Theory]
    [InlineData(0, 0.2, "level before the first")]
    [InlineData(10, 0.2, "on the first")]
    [InlineData(12.5, 0.25, "a quarter of the way")]
    [InlineData(20, 0.4, "on the last")]
    [InlineData(99, 0.4, "level after the last")]
    public void At_AlongATrack_IsOnItsLines(double hour, double expected, string reason) => Expect.Near(expected, Keyframe.At(Track, hour), 1e-12, reason);

    [Fact]
    public void At_WithOneTrack_ChangesThatParameterOnly()
    {
        var course = new Course { ShuntFraction = Track };

        Assert.Equal(Given.Patient with { ShuntFraction = Keyframe.At(Track, 15) }, course.At(Given.Patient, 15));
    }
}

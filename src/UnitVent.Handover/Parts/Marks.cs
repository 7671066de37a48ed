using UnitVent.Charting.Bands;
using UnitVent.Charting.Rules;
using UnitVent.Handover.Layout.Blocks;

namespace UnitVent.Handover.Parts;

/// <summary>The shape that goes with each word.</summary>
internal static class Marks
{
    public static Mark Of(Band band) => band switch
    {
        Band.LookNow => Mark.FilledSquare,
        Band.LookThisHour => Mark.HalfSquare,
        Band.NotKnown => Mark.DashedSquare,
        Band.NothingRaised => Mark.OpenCircle,
    };

    public static Mark Of(Severity severity) => severity switch
    {
        Severity.Urgent => Mark.FilledSquare,
        Severity.Caution => Mark.HalfSquare,
        Severity.Advisory or Severity.Information => Mark.OpenCircle,
    };
}

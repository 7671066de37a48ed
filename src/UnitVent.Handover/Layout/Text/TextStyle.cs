namespace UnitVent.Handover.Layout.Text;

/// <summary>Size and weight of text. A sheet knows four sizes and one weight for emphasis.</summary>
internal sealed record TextStyle(double Points, bool IsBold)
{
    private const double LineSpacing = 1.16;
    private const double BaselineShare = 0.94;

    public static TextStyle Title { get; } = new(13, true);

    public static TextStyle Heading { get; } = new(11, true);

    public static TextStyle Body { get; } = new(10, false);

    public static TextStyle Strong { get; } = new(10, true);

    public static TextStyle Dense { get; } = new(9, false);

    public static TextStyle DenseStrong { get; } = new(9, true);

    public double LineHeight => Points * LineSpacing;

    public double Baseline => Points * BaselineShare;

    public TextStyle Emphasised(bool strong) => this with { IsBold = IsBold || strong };
}

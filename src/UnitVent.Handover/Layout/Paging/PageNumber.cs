using System.Globalization;

namespace UnitVent.Handover.Layout.Paging;

/// <summary>A page's place in its section.</summary>
internal readonly record struct PageNumber(int Number, int Count)
{
    public bool IsFirst => Number == 1;

    public bool IsLast => Number == Count;

    public override string ToString() => string.Create(CultureInfo.InvariantCulture, $"Page {Number} of {Count}");
}

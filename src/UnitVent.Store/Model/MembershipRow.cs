using UnitVent.Store.People;

namespace UnitVent.Store.Model;

internal sealed class MembershipRow
{
    public Guid UnitId { get; set; }

    public Guid UserId { get; set; }

    public UnitRole Role { get; set; }
}

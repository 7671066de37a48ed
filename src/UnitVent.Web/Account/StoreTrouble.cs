using System.Data.Common;

namespace UnitVent.Web.Account;

/// <summary>Tells a database that does not answer from a defect, where accounts are reached without the store's desks.</summary>
public static class StoreTrouble
{
    public static bool Is(Exception thrown) => thrown is DbException or TimeoutException || thrown.InnerException is { } inner && Is(inner);
}

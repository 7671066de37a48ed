using UnitVent.Charting.Results;
using UnitVent.Store.People;
using UnitVent.Web.Shared;

namespace UnitVent.Web.Charting;

/// <summary>Does something as whoever the person is at this moment.</summary>
public static class Acting
{
    public static async Task<Result<T>> DoAsync<T>(this CurrentActor me, Func<Actor, Task<Result<T>>> work) => await work(await me.GetAsync());
}

using System.Reflection;
using Microsoft.AspNetCore.Authorization;
using Microsoft.AspNetCore.Components;

namespace UnitVent.Architecture.Tests;

/// <summary>Every page says who may open it; the pages open to everybody are listed here.</summary>
public sealed class AccessTests
{
    private static readonly string[] OpenToEverybody = ["/failed", "/no-access", "/not-found", "/set-up", "/sign-in"];

    private static IEnumerable<Type> Pages => House.Web.GetTypes().Where(t => t.IsDefined(typeof(RouteAttribute)));

    [Fact]
    public void Pages_AllSayWhoMayOpenThem() =>
        Assert.DoesNotContain(Pages, p => !p.IsDefined(typeof(AuthorizeAttribute)) && !p.IsDefined(typeof(AllowAnonymousAttribute)));

    [Fact]
    public void Pages_OpenToEverybody_AreTheOnesListed()
    {
        var open = Pages.Where(p => p.IsDefined(typeof(AllowAnonymousAttribute))).SelectMany(p => p.GetCustomAttributes<RouteAttribute>()).Select(r => r.Template);
        Assert.Equal(OpenToEverybody, open.Order(StringComparer.Ordinal));
    }
}

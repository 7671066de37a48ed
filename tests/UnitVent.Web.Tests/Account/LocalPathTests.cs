using UnitVent.Web.Account;

namespace UnitVent.Web.Tests.Account;

public sealed class LocalPathTests
{
    [Theory]
    [InlineData("/handover", "/handover")]
    [InlineData("/units/ICU?x=1", "/units/ICU?x=1")]
    [InlineData("//elsewhere.example", "/")]
    [InlineData("/\\elsewhere.example", "/")]
    [InlineData("https://elsewhere.example", "/")]
    [InlineData("/a\r\nb", "/")]
    [InlineData("", "/")]
    [InlineData(null, "/")]
    public void Way_AfterSigningIn_StaysInside(string? wanted, string taken) => Assert.Equal(taken, LocalPath.Of(wanted));
}

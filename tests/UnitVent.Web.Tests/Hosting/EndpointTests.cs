using System.Net;
using Microsoft.AspNetCore.Authorization;
using Microsoft.AspNetCore.Routing;
using Microsoft.Extensions.DependencyInjection;

namespace UnitVent.Web.Tests.Hosting;

/// <summary>Nothing answers a stranger but what is listed here.</summary>
[Collection(AppCollection.Name)]
public sealed class EndpointTests(RunningApp app)
{
    private static readonly string[] OpenToEverybody = ["/failed", "/livez", "/no-access", "/not-found", "/readyz", "/set-up", "/sign-in"];

    private IEnumerable<RouteEndpoint> Endpoints => app.Services.GetRequiredService<EndpointDataSource>().Endpoints.OfType<RouteEndpoint>();

    [Fact]
    public void Endpoints_OpenToEverybody_AreTheOnesListed()
    {
        var open = Endpoints.Where(e => e.Metadata.GetMetadata<IAllowAnonymous>() is not null)
            .Where(e => e.Metadata.All(m => m.GetType().Name != "StaticAssetDescriptor"))
            .Select(e => "/" + e.RoutePattern.RawText!.TrimStart('/'))
            .Distinct();
        Assert.Equal(OpenToEverybody, open.Order(StringComparer.Ordinal));
    }

    [Fact]
    public async Task Endpoints_AskedByAStranger_AnswerNothing()
    {
        var guarded = Endpoints.Where(e => e.Metadata.GetMetadata<IAllowAnonymous>() is null).ToList();
        Assert.NotEmpty(guarded);
        foreach (var endpoint in guarded)
        {
            var path = "/" + string.Join('/', endpoint.RoutePattern.PathSegments.Select(s => string.Concat(s.Parts.Select(Part))));
            var method = endpoint.Metadata.GetMetadata<HttpMethodMetadata>()?.HttpMethods[0] ?? "GET";
            using var request = new HttpRequestMessage(new HttpMethod(method), path);
            using var answer = await app.Http.SendAsync(request, TestContext.Current.CancellationToken);
            var sentAway = answer.StatusCode == HttpStatusCode.Redirect && answer.Headers.Location!.ToString().Contains("/sign-in", StringComparison.Ordinal);
            Assert.True(sentAway || answer.StatusCode == HttpStatusCode.Unauthorized, $"{method} {path}: {answer.StatusCode}");
        }
    }

    private static string Part(Microsoft.AspNetCore.Routing.Patterns.RoutePatternPart part) => part switch
    {
        Microsoft.AspNetCore.Routing.Patterns.RoutePatternLiteralPart literal => literal.Content,
        Microsoft.AspNetCore.Routing.Patterns.RoutePatternSeparatorPart separator => separator.Content,
        Microsoft.AspNetCore.Routing.Patterns.RoutePatternParameterPart { ParameterPolicies.Count: > 0 } => Guid.Empty.ToString(),
        _ => "x",
    };
}

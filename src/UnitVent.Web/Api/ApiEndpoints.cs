using Microsoft.AspNetCore.Diagnostics;
using UnitVent.Store.People;
using UnitVent.Web.Hosting;

namespace UnitVent.Web.Api;

/// <summary>The HTTP interface, version 1: the same desks as the screens, nothing that these would refuse.</summary>
public static class ApiEndpoints
{
    public const string Root = "/api";

    public static void AddApi(this IServiceCollection services)
    {
        services.ConfigureHttpJsonOptions(json => ApiJson.Configure(json.SerializerOptions));
        services.AddOpenApi("v1", document =>
        {
            document.AddOperationTransformer(WriteDescription.AddBodyAsync);
            document.AddDocumentTransformer(WriteDescription.AddHeadAsync);
        });
    }

    public static void MapApi(this IEndpointRouteBuilder routes)
    {
        var api = routes.MapGroup(Root + "/v1").RequireAuthorization(Policies.Token).RequireRateLimiting(RateLimits.Api).DisableAntiforgery();
        api.MapUnits();
        api.MapEpisodes();
        api.MapEntries();
        api.MapFollowUps();
        api.MapPass();
        api.MapPictures();
        api.MapFlags();
        api.MapSheets();
        routes.Map(Root + "/{**rest}", () => Problems.NotHere()).RequireAuthorization(Policies.Token).RequireRateLimiting(RateLimits.Api).DisableAntiforgery().ExcludeFromDescription();
        routes.MapOpenApi().RequireAuthorization(Policies.SessionOrToken).ExcludeFromDescription();
    }

    /// <summary>Answers a defect, or a request that cannot be read, without a word of what is inside.</summary>
    public static void UseApiProblems(this IApplicationBuilder app) => app.UseExceptionHandler(failed => failed.Run(http =>
    {
        var thrown = http.Features.Get<IExceptionHandlerFeature>()?.Error;
        return Problems.Failed((thrown as BadHttpRequestException)?.StatusCode ?? StatusCodes.Status500InternalServerError, http.TraceIdentifier).ExecuteAsync(http);
    }));

    /// <summary>Who the token stands for.</summary>
    public static Actor Actor(this HttpContext http) => http.Features.Get<Actor>() ?? throw new InvalidOperationException("The endpoint does not demand a token.");
}

using System.Globalization;
using System.Text.Json.Nodes;
using Microsoft.AspNetCore.OpenApi;
using Microsoft.OpenApi;
using UnitVent.Charting.Fields;

namespace UnitVent.Web.Api;

/// <summary>Says in the OpenAPI document what a write takes: the fields of a type, and what every write carries.</summary>
/// <param name="Type">A type whose members have fields.</param>
/// <param name="Corrections">Whether it may correct another.</param>
public sealed record WriteDescription(Type Type, bool Corrections = false)
{
    /// <summary>Describes the body of an operation whose endpoint carries this.</summary>
    public static Task AddBodyAsync(OpenApiOperation operation, OpenApiOperationTransformerContext context, CancellationToken cancel)
    {
        if (context.Description.ActionDescriptor.EndpointMetadata.OfType<WriteDescription>().FirstOrDefault() is { } body)
        {
            operation.RequestBody = new OpenApiRequestBody
            {
                Required = true,
                Content = new Dictionary<string, OpenApiMediaType> { ["application/json"] = new() { Schema = body.Schema() } },
            };
        }

        return Task.CompletedTask;
    }

    /// <summary>Describes the interface as a whole.</summary>
    public static Task AddHeadAsync(OpenApiDocument document, OpenApiDocumentTransformerContext context, CancellationToken cancel)
    {
        document.Info.Title = "UnitVent";
        document.Info.Description = "What is charted about ventilated patients, and what is computed from it. Observations, not orders.";
        document.Servers = [];
        document.Components ??= new OpenApiComponents();
        document.Components.SecuritySchemes = new Dictionary<string, IOpenApiSecurityScheme>
        {
            ["token"] = new OpenApiSecurityScheme { Type = SecuritySchemeType.Http, Scheme = "bearer", Description = "Made by an administrator for one unit and role." },
        };
        document.Security = [new OpenApiSecurityRequirement { [new OpenApiSecuritySchemeReference("token", document)] = [] }];
        return Task.CompletedTask;
    }

    private OpenApiSchema Schema()
    {
        var fields = EntryFields.Of(Type);
        var members = fields.ToDictionary(f => f.Name, IOpenApiSchema (f) => Member(f));
        members["id"] = new OpenApiSchema { Type = JsonSchemaType.String, Format = "uuid", Description = "UUID version 7 made by the caller." };
        members["confirmed"] = new OpenApiSchema
        {
            Type = JsonSchemaType.Array,
            Items = new OpenApiSchema { Type = JsonSchemaType.String },
            Description = "Codes of the questions answered with yes.",
        };
        if (Corrections)
        {
            members["corrects"] = new OpenApiSchema { Type = JsonSchemaType.String, Format = "uuid", Description = "The entry that this one replaces." };
            members["correctionReason"] = new OpenApiSchema { Type = JsonSchemaType.String, Description = "Why; needed with corrects." };
        }

        return new OpenApiSchema
        {
            Type = JsonSchemaType.Object,
            AdditionalPropertiesAllowed = false,
            Properties = members,
            Required = fields.Where(f => f.Required).Select(f => f.Name).Append("id").ToHashSet(),
        };
    }

    private static OpenApiSchema Member(EntryField field) => new()
    {
        Type = TypeOf(field.Kind),
        Format = field.Kind switch { FieldKind.Time => "date-time", FieldKind.Date => "date", _ => null },
        Description = field.Number is { Unit.Length: > 0 } number ? $"{field.Label} in {number.Unit}" : field.Label,
        Minimum = field.Number is { IsTension: false } low ? low.Low.ToString(CultureInfo.InvariantCulture) : null,
        Maximum = field.Number is { IsTension: false } high ? high.High.ToString(CultureInfo.InvariantCulture) : null,
        MaxLength = field.Kind == FieldKind.Text ? field.MaxLength : null,
        Enum = field.Kind == FieldKind.Choice ? [.. field.Choices.Select(c => JsonValue.Create(c)!)] : null,
    };

    private static JsonSchemaType TypeOf(FieldKind kind) => kind switch
    {
        FieldKind.Number => JsonSchemaType.Number,
        FieldKind.Whole => JsonSchemaType.Integer,
        FieldKind.YesNo => JsonSchemaType.Boolean,
        FieldKind.Text or FieldKind.Time or FieldKind.Date or FieldKind.Choice => JsonSchemaType.String,
    };
}

/// <summary>Marks endpoints that take a write.</summary>
public static class WriteMarks
{
    public static RouteHandlerBuilder Writes<T>(this RouteHandlerBuilder endpoint) => endpoint.WithMetadata(new WriteDescription(typeof(T)));
}

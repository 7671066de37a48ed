using System.Globalization;
using System.Text.Json.Nodes;
using Microsoft.AspNetCore.OpenApi;
using Microsoft.OpenApi;
using UnitVent.Charting.Fields;

namespace UnitVent.Web.Api;

/// <summary>Says in the OpenAPI document what a write takes: the fields of a type, and what every write carries.</summary>
/// <param name="Type">A type whose members have fields.</param>
public sealed record EntryBody(Type Type)
{
    /// <summary>Describes the body of an operation whose endpoint carries this.</summary>
    public static Task Describe(OpenApiOperation operation, OpenApiOperationTransformerContext context, CancellationToken cancel)
    {
        if (context.Description.ActionDescriptor.EndpointMetadata.OfType<EntryBody>().FirstOrDefault() is { } body)
        {
            operation.RequestBody = new OpenApiRequestBody
            {
                Required = true,
                Content = new Dictionary<string, OpenApiMediaType> { ["application/json"] = new() { Schema = body.Schema() } },
            };
        }

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

namespace UnitVent.Web.Handover;

/// <summary>A printed sheet.</summary>
/// <param name="Pdf">The document.</param>
/// <param name="FileName">A name without anything of a patient.</param>
public sealed record Sheet(byte[] Pdf, string FileName)
{
    /// <summary>Shown in the browser's own viewer.</summary>
    public IResult Answer(HttpContext http)
    {
        http.Response.Headers.ContentDisposition = $"inline; filename=\"{FileName}\"";
        return TypedResults.Bytes(Pdf, "application/pdf");
    }
}

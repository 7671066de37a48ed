using System.Collections.Concurrent;
using System.Text;
using PdfSharp.Fonts;

namespace UnitVent.Handover.Layout.Fonts;

/// <summary>The fonts of this machine: a regular and a bold face for text, and every other file for characters those lack.</summary>
internal sealed class SystemFonts
{
    /// <summary>Names a folder that is searched instead of the usual ones.</summary>
    public const string FolderVariable = "UNITVENT_FONT_FOLDER";

    private static readonly (string Regular, string Bold)[] TextFaces =
    [
        ("DejaVuSans", "DejaVuSans-Bold"),
        ("LiberationSans-Regular", "LiberationSans-Bold"),
        ("NotoSans-Regular", "NotoSans-Bold"),
        ("arial", "arialbd"),
    ];

    private static readonly Lazy<SystemFonts> FromThisMachine = new(
        () => In(Environment.GetEnvironmentVariable(FolderVariable) is { Length: > 0 } folder ? [folder] : UsualFolders),
        LazyThreadSafetyMode.PublicationOnly);

    private readonly IReadOnlyList<FontFile> others;
    private readonly ConcurrentDictionary<Rune, FontFile?> fallbacks = new();

    static SystemFonts() => GlobalFontSettings.FontResolver = new FontFileResolver();

    public SystemFonts(FontFile regular, FontFile bold, IReadOnlyList<FontFile> others)
    {
        Regular = regular;
        Bold = bold;
        this.others = others;
    }

    /// <summary>Gets the fonts installed here.</summary>
    /// <exception cref="InvalidOperationException">No font for text is installed.</exception>
    public static SystemFonts Installed => FromThisMachine.Value;

    public FontFile Regular { get; }

    public FontFile Bold { get; }

    private static IReadOnlyList<string> UsualFolders
    {
        get
        {
            var home = Environment.GetFolderPath(Environment.SpecialFolder.UserProfile);
            var machine = Environment.GetFolderPath(Environment.SpecialFolder.Fonts);
            return
            [
                "/usr/share/fonts", "/usr/local/share/fonts", Path.Combine(home, ".local/share/fonts"), Path.Combine(home, ".fonts"),
                "/Library/Fonts", "/System/Library/Fonts", .. machine.Length > 0 ? [machine] : Array.Empty<string>(),
            ];
        }
    }

    /// <summary>The fonts found in these folders and below.</summary>
    /// <exception cref="InvalidOperationException">None of the faces for text is there; the message names a package that brings one.</exception>
    public static SystemFonts In(IReadOnlyList<string> folders)
    {
        var options = new EnumerationOptions { RecurseSubdirectories = true, IgnoreInaccessible = true, MatchCasing = MatchCasing.CaseInsensitive };
        var files = folders.Where(Directory.Exists)
            .SelectMany(folder => Directory.EnumerateFiles(folder, "*.ttf", options))
            .Select(path => new FontFile(path))
            .OrderBy(file => IsSlantedOrBold(file.Name)).ThenBy(file => file.Name, StringComparer.Ordinal)
            .ToList();
        foreach (var (regular, bold) in TextFaces)
        {
            if (Named(files, regular) is { } regularFile && Named(files, bold) is { } boldFile)
            {
                return new SystemFonts(regularFile, boldFile, files);
            }
        }

        throw new InvalidOperationException(
            $"No font for printing was found in {string.Join(", ", folders)}. "
            + "Install one, for example the package fonts-dejavu-core (Debian, Ubuntu), dejavu-sans-fonts (Fedora) or ttf-dejavu (Alpine), "
            + $"or name a folder with DejaVuSans.ttf and DejaVuSans-Bold.ttf in {FolderVariable}.");
    }

    /// <summary>The file that draws a character: the text face if it can, else any installed; null when none has it.</summary>
    public FontFile? For(Rune character, bool bold)
    {
        var face = bold ? Bold : Regular;
        return face.Has(character) ? face : fallbacks.GetOrAdd(character, missing => others.FirstOrDefault(file => file.Has(missing)));
    }

    private static FontFile? Named(List<FontFile> files, string name) =>
        files.Find(file => string.Equals(file.Name, name, StringComparison.OrdinalIgnoreCase));

    private static bool IsSlantedOrBold(string name) =>
        name.Contains("Bold", StringComparison.OrdinalIgnoreCase)
        || name.Contains("Italic", StringComparison.OrdinalIgnoreCase)
        || name.Contains("Oblique", StringComparison.OrdinalIgnoreCase);
}

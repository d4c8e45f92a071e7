namespace RadicalSites.Formats.Sdf;

/// <summary>One data item of an SDF record.</summary>
/// <remarks>Immutable and safe for use by many threads.</remarks>
/// <param name="Name">Field name: the text between the angle brackets of the header, or the header without its &gt;.</param>
/// <param name="Value">Lines of the value separated by LF; may be empty.</param>
public sealed record SdfField(string Name, string Value)
{
    /// <summary>The header line as it stands, for example <c>&gt; 25 &lt;MELTING.POINT&gt;</c>; empty for a new item.</summary>
    public string Header { get; init; } = "";
}

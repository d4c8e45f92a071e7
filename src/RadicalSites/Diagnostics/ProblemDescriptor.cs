using System;
using System.Globalization;

namespace RadicalSites.Diagnostics;

/// <summary>One entry of the catalogue of codes: what can go wrong or deserves a remark, why, and what to do.</summary>
/// <remarks>Immutable and safe for use by many threads.</remarks>
/// <param name="Code">Stable kebab-case code, for example <c>smiles-ring-unclosed</c>.</param>
/// <param name="Severity">Severity of every message with this code.</param>
/// <param name="Title">The matter in a few words.</param>
/// <param name="MessageFormat">Message with numbered placeholders.</param>
/// <param name="Cause">Probable cause, one or two sentences.</param>
/// <param name="Remedy">What to do about it, one or two sentences.</param>
public sealed record ProblemDescriptor(
    string Code, Severity Severity, string Title, string MessageFormat, string Cause, string Remedy)
{
    /// <summary>Fills the placeholders of the message with the invariant culture.</summary>
    /// <param name="arguments">One value for each placeholder.</param>
    /// <returns>The message.</returns>
    public string Format(params object[] arguments)
    {
        ArgumentNullException.ThrowIfNull(arguments);
        return arguments.Length == 0 ? MessageFormat : string.Format(CultureInfo.InvariantCulture, MessageFormat, arguments);
    }
}

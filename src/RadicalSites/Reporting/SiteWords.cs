using System;
using System.Text;
using System.Text.Json;
using RadicalSites.Course;
using RadicalSites.Diagnostics;
using RadicalSites.Products;
using RadicalSites.Selectivity;
using RadicalSites.Sites;
using RadicalSites.Symmetry;
using RadicalSites.Thermochemistry;

namespace RadicalSites.Reporting;

/// <summary>The words that reports use for the members of enumerations: kebab-case, for example <c>hetero-benzylic</c>.</summary>
/// <remarks>Stateless and safe for use by many threads.</remarks>
public static partial class SiteWords
{
    /// <summary>Word for a degree.</summary>
    /// <param name="degree">The degree.</param>
    /// <returns>methyl, primary, secondary or tertiary.</returns>
    public static string Of(SiteDegree degree) => Terms<SiteDegree>.Text[(int)degree];

    /// <summary>Word for a kind of conjugation.</summary>
    /// <param name="kind">The kind.</param>
    /// <returns>benzylic, hetero-benzylic, allylic or propargylic.</returns>
    public static string Of(ConjugationKind kind) => Terms<ConjugationKind>.Text[(int)kind];

    /// <summary>Word for a functional group.</summary>
    /// <param name="kind">The kind.</param>
    /// <returns>For example <c>amide-nitrogen</c>.</returns>
    public static string Of(AlphaGroupKind kind) => Terms<AlphaGroupKind>.Text[(int)kind];

    /// <summary>Word for a topicity.</summary>
    /// <param name="topicity">The topicity.</param>
    /// <returns>homotopic, enantiotopic, diastereotopic or constitutional.</returns>
    public static string Of(Topicity topicity) => Terms<Topicity>.Text[(int)topicity];

    /// <summary>Word for the basis of a bond enthalpy.</summary>
    /// <param name="basis">The basis.</param>
    /// <returns>measured, class, increments or none.</returns>
    public static string Of(BdeBasis basis) => Terms<BdeBasis>.Text[(int)basis];

    /// <summary>Word for a chain verdict.</summary>
    /// <param name="verdict">The verdict.</param>
    /// <returns>propagates, slow, refused or unknown.</returns>
    public static string Of(ChainVerdict verdict) => Terms<ChainVerdict>.Text[(int)verdict];

    /// <summary>Word for the route to a product.</summary>
    /// <param name="route">The route.</param>
    /// <returns>direct or transposed.</returns>
    public static string Of(ProductRoute route) => Terms<ProductRoute>.Text[(int)route];

    /// <summary>Word for a stereochemical outcome.</summary>
    /// <param name="outcome">The outcome.</param>
    /// <returns>none, racemic, diastereomers, retained, epimerised or lost.</returns>
    public static string Of(StereoOutcome outcome) => Terms<StereoOutcome>.Text[(int)outcome];

    /// <summary>Word for a severity.</summary>
    /// <param name="severity">The severity.</param>
    /// <returns>info, caution, danger or error.</returns>
    public static string Of(Severity severity) => Terms<Severity>.Text[(int)severity];

    /// <summary>Word for what a relative rate rests on.</summary>
    /// <param name="basis">The basis.</param>
    /// <returns>model, measured-ratio or none.</returns>
    public static string Of(CourseRateBasis basis) => Terms<CourseRateBasis>.Text[(int)basis];

    internal static JsonEncodedText Encoded(SiteDegree value) => Terms<SiteDegree>.Json[(int)value];

    internal static JsonEncodedText Encoded(ConjugationKind value) => Terms<ConjugationKind>.Json[(int)value];

    internal static JsonEncodedText Encoded(AlphaGroupKind value) => Terms<AlphaGroupKind>.Json[(int)value];

    internal static JsonEncodedText Encoded(Topicity value) => Terms<Topicity>.Json[(int)value];

    internal static JsonEncodedText Encoded(BdeBasis value) => Terms<BdeBasis>.Json[(int)value];

    internal static JsonEncodedText Encoded(ChainVerdict value) => Terms<ChainVerdict>.Json[(int)value];

    internal static JsonEncodedText Encoded(ProductRoute value) => Terms<ProductRoute>.Json[(int)value];

    internal static JsonEncodedText Encoded(StereoOutcome value) => Terms<StereoOutcome>.Json[(int)value];

    internal static JsonEncodedText Encoded(Severity value) => Terms<Severity>.Json[(int)value];

    private static string Kebab(string name)
    {
        var text = new StringBuilder(name.Length + 4);
        for (int i = 0; i < name.Length; i++)
        {
            if (char.IsAsciiLetterUpper(name[i]) && i > 0)
            {
                text.Append('-');
            }

            text.Append(char.ToLowerInvariant(name[i]));
        }

        return text.ToString();
    }

    // Members are numbered from 0 without gaps, so the number is the index.
    private static class Terms<T>
        where T : struct, Enum
    {
        internal static readonly string[] Text = Array.ConvertAll(Enum.GetNames<T>(), Kebab);

        internal static readonly JsonEncodedText[] Json =
            Array.ConvertAll(Text, static text => JsonEncodedText.Encode(text));
    }
}

using System.Text;
using RadicalSites.Sites;
using RadicalSites.Thermochemistry;

namespace RadicalSites.Reporting;

/// <summary>The words that outputs use for classes: lower case, hyphenated.</summary>
/// <remarks>Stateless and safe for use by many threads.</remarks>
public static class SiteWords
{
    private static readonly string[] AlphaWords = BuildAlpha();

    /// <summary>Word for a degree.</summary>
    /// <param name="degree">A degree.</param>
    /// <returns>methyl, primary, secondary or tertiary.</returns>
    public static string Of(SiteDegree degree) => degree switch
    {
        SiteDegree.Methyl => "methyl",
        SiteDegree.Primary => "primary",
        SiteDegree.Secondary => "secondary",
        _ => "tertiary",
    };

    /// <summary>Word for a conjugation.</summary>
    /// <param name="kind">A kind of pi group.</param>
    /// <returns>benzylic, hetero-benzylic, allylic or propargylic.</returns>
    public static string Of(ConjugationKind kind) => kind switch
    {
        ConjugationKind.Benzylic => "benzylic",
        ConjugationKind.HeteroBenzylic => "hetero-benzylic",
        ConjugationKind.Allylic => "allylic",
        _ => "propargylic",
    };

    /// <summary>Word for a group beside the carbon.</summary>
    /// <param name="kind">A kind of group.</param>
    /// <returns>For example <c>ester-oxygen</c>.</returns>
    public static string Of(AlphaGroupKind kind) => AlphaWords[(int)kind];

    /// <summary>Word for what a bond enthalpy rests on.</summary>
    /// <param name="basis">A basis.</param>
    /// <returns>measured, class, increments or none.</returns>
    public static string Of(BdeBasis basis) => basis switch
    {
        BdeBasis.Measured => "measured",
        BdeBasis.Class => "class",
        BdeBasis.Increments => "increments",
        _ => "none",
    };

    /// <summary>All class words of a site in one phrase.</summary>
    /// <param name="site">A site.</param>
    /// <returns>For example <c>secondary, benzylic, alpha ether, bridgehead</c>.</returns>
    public static string Describe(Site site)
    {
        System.ArgumentNullException.ThrowIfNull(site);
        var text = new StringBuilder(Of(site.Degree));
        foreach (ConjugatedNeighbor neighbor in site.Conjugation)
        {
            text.Append(", ").Append(Of(neighbor.Kind));
        }

        foreach (AlphaGroup group in site.AlphaGroups)
        {
            text.Append(", alpha ").Append(Of(group.Kind));
        }

        if (site.IsBridgehead)
        {
            text.Append(", bridgehead");
        }

        return text.ToString();
    }

    private static string[] BuildAlpha()
    {
        string[] names = System.Enum.GetNames<AlphaGroupKind>();
        for (int i = 0; i < names.Length; i++)
        {
            var word = new StringBuilder();
            foreach (char c in names[i])
            {
                if (char.IsAsciiLetterUpper(c) && word.Length > 0)
                {
                    word.Append('-');
                }

                word.Append(char.ToLowerInvariant(c));
            }

            names[i] = word.ToString();
        }

        return names;
    }
}

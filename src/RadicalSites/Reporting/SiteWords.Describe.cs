using System.Collections.Generic;
using System.Globalization;
using System.Text;
using RadicalSites.Molecules;
using RadicalSites.Sites;

namespace RadicalSites.Reporting;

public static partial class SiteWords
{
    private const int CarbonsListed = 6;

    /// <summary>The class of a site in words.</summary>
    /// <param name="site">A site.</param>
    /// <returns>For example <c>secondary, benzylic, alpha ether, ring 6</c>.</returns>
    public static string Describe(Site site)
    {
        System.ArgumentNullException.ThrowIfNull(site);
        var text = new StringBuilder(SiteWords.Of(site.Degree));
        Append(text, site.Conjugation, static neighbor => SiteWords.Of(neighbor.Kind), "");
        Append(text, site.AlphaGroups, static group => SiteWords.Of(group.Kind).Replace('-', ' '), "alpha ");
        if (site.RingSize is { } size)
        {
            text.Append(CultureInfo.InvariantCulture, $", ring {size}");
        }

        if (site.IsBridgehead)
        {
            text.Append(", bridgehead");
        }

        if (site.FormalCharge != 0)
        {
            text.Append(CultureInfo.InvariantCulture, $", charge {site.FormalCharge}");
        }

        return text.ToString();
    }

    /// <summary>The carbons of a site, as indices of the input.</summary>
    /// <param name="molecule">The molecule of the site.</param>
    /// <param name="site">A site.</param>
    /// <returns>Indices separated by commas; after six of them the number of further ones.</returns>
    public static string Carbons(Molecule molecule, Site site)
    {
        System.ArgumentNullException.ThrowIfNull(molecule);
        System.ArgumentNullException.ThrowIfNull(site);
        var text = new StringBuilder();
        for (int i = 0; i < site.Carbons.Count && (i < CarbonsListed || site.Carbons.Count == CarbonsListed + 1); i++)
        {
            text.Append(i > 0 ? "," : "").Append(CultureInfo.InvariantCulture, $"{molecule.InputIndexOf(site.Carbons[i])}");
        }

        if (site.Carbons.Count > CarbonsListed + 1)
        {
            text.Append(CultureInfo.InvariantCulture, $" +{site.Carbons.Count - CarbonsListed}");
        }

        return text.ToString();
    }

    // Repeated words are counted, so diphenylmethane reads "benzylic x2".
    private static void Append<T>(
        StringBuilder text, IReadOnlyList<T> members, System.Func<T, string> word, string prefix)
    {
        for (int i = 0; i < members.Count; i++)
        {
            string own = word(members[i]);
            int same = 1;
            bool isFirst = true;
            for (int j = 0; j < members.Count; j++)
            {
                if (j != i && word(members[j]) == own)
                {
                    isFirst &= j > i;
                    same++;
                }
            }

            if (isFirst)
            {
                text.Append(", ").Append(prefix).Append(own);
                text.Append(same > 1 ? string.Create(CultureInfo.InvariantCulture, $" x{same}") : "");
            }
        }
    }
}

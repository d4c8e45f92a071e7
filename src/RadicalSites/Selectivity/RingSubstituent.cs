using RadicalSites.Molecules;
using RadicalSites.Perception;
using RadicalSites.Sites;

namespace RadicalSites.Selectivity;

/// <summary>Names the substituents of a benzene ring for the Hammett table.</summary>
internal static class RingSubstituent
{
    /// <summary>Row of the Hammett table for a substituent, or null when there is none.</summary>
    internal static string? NameOf(Molecule molecule, int ringAtom, int atom)
    {
        Atom data = molecule.AtomSpan[atom];
        if (data.AtomicNumber == 6)
        {
            if (data.IsAromatic)
            {
                return "Aryl";
            }

            return AlphaGroupPerception.KindOf(molecule, ringAtom, atom) switch
            {
                AlphaGroupKind.Trifluoromethyl => "Trifluoromethyl",
                AlphaGroupKind.Nitrile => "Nitrile",
                AlphaGroupKind.Ester or AlphaGroupKind.Amide => "Ester",
                AlphaGroupKind.CarboxylicAcid => "CarboxylicAcid",
                AlphaGroupKind.Ketone => "Ketone",
                AlphaGroupKind.Aldehyde => "Aldehyde",
                AlphaGroupKind.AcylHalide => "AcylHalide",
                null when LocalPatterns.HasOnlySingleBonds(molecule, atom) => "Alkyl",
                _ => null,
            };
        }

        return AlphaGroupPerception.KindOf(molecule, ringAtom, atom) switch
        {
            AlphaGroupKind.Fluorine => "Fluorine",
            AlphaGroupKind.Chlorine => "Chlorine",
            AlphaGroupKind.Bromine => "Bromine",
            AlphaGroupKind.Iodine => "Iodine",
            AlphaGroupKind.Nitro => "Nitro",
            AlphaGroupKind.Hydroxyl => "Hydroxyl",
            AlphaGroupKind.Ether => "Alkoxy",
            AlphaGroupKind.EsterOxygen => "Acyloxy",
            AlphaGroupKind.Sulfonyl => "Sulfonyl",
            AlphaGroupKind.Amine => "Amino",
            _ => null,
        };
    }
}

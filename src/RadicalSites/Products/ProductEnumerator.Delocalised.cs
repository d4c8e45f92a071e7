using System;
using System.Collections.Generic;
using RadicalSites.Diagnostics;
using RadicalSites.Molecules;
using RadicalSites.Sites;

namespace RadicalSites.Products;

public static partial class ProductEnumerator
{
    private sealed partial class Work
    {
        // Direct product and those at the other ends of the radical; equal products need no split.
        private void AddDelocalised(
            Site site, double whole, Molecule direct, string directSmiles, bool hasMirrorImage)
        {
            var paths = new List<int[]>();
            Report(site, HasMobileNeighbor(site)
                ? DelocalisationWalk.Find(analysis.Molecule, site.Carbons[0], paths)
                : DelocalisationBarriers.AromaticRing);
            var ends = new List<(string Smiles, Molecule Molecule, int[] Path, ProductRoute Route)>
            {
                (directSmiles, direct, [], ProductRoute.Direct),
            };
            foreach (int[] path in paths)
            {
                Molecule product = substrate.Transpose(path, halogen, out string smiles);
                if (!ends.Exists(end => end.Smiles == smiles))
                {
                    ends.Add((smiles, product, path, ProductRoute.Transposed));
                }
            }

            EndSplit? split = ends.Count == 1 ? null : EndSplit.Find(analysis.Molecule, site, ends[^1].Path[^1], ends.Count, halogen);
            if (split is null && options.GivesUnknownSplitToDirect && ends.Count > 1)
            {
                ReportSplit(site, ends.Count, split);
                ends.RemoveRange(1, ends.Count - 1);
            }

            for (int i = 0; i < ends.Count; i++)
            {
                (string smiles, Molecule molecule, int[] path, ProductRoute route) = ends[i];
                ProductDraft draft = Find(smiles, molecule);
                Classify(draft, site, route, route == ProductRoute.Direct
                    ? substrate.Outcome(site, halogen, molecule)
                    : substrate.TransposedOutcome(path, halogen, molecule));
                draft.Route = route == ProductRoute.Direct ? route : draft.Route;
                draft.HasMirrorImage |= hasMirrorImage;
                if (ends.Count == 1)
                {
                    draft.Add(site.Number, site.HydrogenCount, whole, whole, whole);
                }
                else if (split is null)
                {
                    draft.Add(site.Number, site.HydrogenCount, double.NaN, 0, whole);
                }
                else
                {
                    double part = i == 0 ? split.DirectPart : 1 - split.DirectPart;
                    draft.Add(
                        site.Number, site.HydrogenCount, whole * part, whole * Math.Max(0, part - split.HalfWidth),
                        whole * Math.Min(1, part + split.HalfWidth));
                }
            }

            if (ends.Count > 1)
            {
                ReportSplit(site, ends.Count, split);
            }
        }

        // Beside aromatic rings alone the radical has no other end that could take a halogen.
        private static bool HasMobileNeighbor(Site site)
        {
            foreach (ConjugatedNeighbor neighbor in site.Conjugation)
            {
                if (neighbor.Kind is ConjugationKind.Allylic or ConjugationKind.Propargylic)
                {
                    return true;
                }
            }

            return false;
        }

        private void Report(Site site, DelocalisationBarriers barriers)
        {
            if ((barriers & DelocalisationBarriers.AromaticRing) != 0)
            {
                diagnostics.Add(Diagnostic.Create(ProblemCatalogue.Products.RingPositionExcluded, site.Carbons, site.Number));
            }

            if ((barriers & DelocalisationBarriers.Heteroatom) != 0)
            {
                diagnostics.Add(Diagnostic.Create(ProblemCatalogue.Products.HeteroatomEndExcluded, site.Carbons, site.Number));
            }

            if ((barriers & DelocalisationBarriers.SmallRing) != 0)
            {
                diagnostics.Add(Diagnostic.Create(ProblemCatalogue.Products.StrainedEndExcluded, site.Carbons, site.Number));
            }
        }

        private void ReportSplit(Site site, int ends, EndSplit? split)
        {
            if (split is not null)
            {
                diagnostics.Add(Diagnostic.Create(
                    ProblemCatalogue.Products.EndSplitFromAnalogue, site.Carbons, site.Number, ends, split.Analogue,
                    split.Source));
            }
            else if (shares?.ShareOf(site.Number) is { } share)
            {
                diagnostics.Add(Diagnostic.Create(
                    ProblemCatalogue.Products.EndSplitUnknown, site.Carbons, site.Number, ends, share));
            }
        }
    }
}

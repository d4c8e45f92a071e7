using System.Collections.Generic;
using RadicalSites.Molecules;

namespace RadicalSites.Products;

/// <summary>A product while the sites that lead to it are collected.</summary>
internal sealed class ProductDraft(string smiles, Molecule molecule)
{
    internal string Smiles { get; } = smiles;

    internal Molecule Molecule { get; } = molecule;

    internal ProductRoute Route { get; set; } = ProductRoute.Transposed;

    internal StereoOutcome Stereo { get; set; }

    /// <summary>Whether a site has enantiotopic carbons, so that the mirror image forms as well.</summary>
    internal bool HasMirrorImage { get; set; }

    /// <summary>Sites with the part of their share that comes here; <see cref="double.NaN"/> = unknown part.</summary>
    internal List<(int Site, int Hydrogens, double Part, double PartLow, double PartHigh)> Origins { get; } = [];

    /// <summary>Adds a site; carbons of one site that arrive one after the other are added up.</summary>
    internal void Add(int site, int hydrogens, double part, double partLow, double partHigh)
    {
        for (int i = 0; i < Origins.Count; i++)
        {
            if (Origins[i].Site == site)
            {
                var known = Origins[i];
                Origins[i] = (
                    site, known.Hydrogens + hydrogens, known.Part + part, known.PartLow + partLow, System.Math.Min(1, known.PartHigh + partHigh));
                return;
            }
        }

        Origins.Add((site, hydrogens, part, partLow, partHigh));
    }
}

using System;
using System.Collections.Frozen;
using System.Collections.Generic;
using RadicalSites.Diagnostics;

namespace RadicalSites.Molecules;

/// <summary>Standard atomic weights of the elements and masses of common nuclides.</summary>
/// <remarks>
/// Source: [IUPAC2021] abridged standard atomic weights; [AME2020] for nuclides. Immutable and safe for use by many
/// threads.
/// </remarks>
public static class AtomicWeights
{
    /// <summary>Mass of one mole of an element or nuclide [g/mol].</summary>
    /// <param name="atomicNumber">Atomic number 1 to 118.</param>
    /// <param name="massNumber">Mass number of a stated nuclide, or 0 for the natural mixture.</param>
    /// <returns>
    /// The mass, or <see langword="null"/> for the wildcard and for elements without a standard atomic weight. A nuclide
    /// that is not in the table gets its mass number, which is right to 0.1 g/mol.
    /// </returns>
    public static double? Find(int atomicNumber, int massNumber = 0)
    {
        if (atomicNumber is < 1 or > Elements.Last)
        {
            return null;
        }

        if (massNumber > 0)
        {
            return Table.Nuclides.TryGetValue((atomicNumber, massNumber), out double mass) ? mass : massNumber;
        }

        double weight = Table.Weights[atomicNumber];
        return double.IsNaN(weight) ? null : weight;
    }

    private static class Table
    {
        internal static readonly double[] Weights = ReadWeights();
        internal static readonly FrozenDictionary<(int Element, int MassNumber), double> Nuclides = ReadNuclides();

        private static double[] ReadWeights()
        {
            var weights = new double[Elements.Last + 1];
            Array.Fill(weights, double.NaN);
            foreach (CsvRow row in CsvTable.ReadEmbedded("elements.csv", "atomic_number", "symbol", "atomic_weight").Rows)
            {
                weights[row.Integer("atomic_number", 1, Elements.Last)] = row.OptionalNumber("atomic_weight", 1, 400) ?? double.NaN;
            }

            return weights;
        }

        private static FrozenDictionary<(int Element, int MassNumber), double> ReadNuclides()
        {
            var masses = new Dictionary<(int Element, int MassNumber), double>();
            foreach (CsvRow row in CsvTable.ReadEmbedded("isotopes.csv", "atomic_number", "mass_number", "mass").Rows)
            {
                masses.Add(
                    (row.Integer("atomic_number", 1, Elements.Last), row.Integer("mass_number", 1, 400)),
                    row.Number("mass", 1, 400));
            }

            return masses.ToFrozenDictionary();
        }
    }
}

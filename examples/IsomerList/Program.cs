using System;
using RadicalSites.Formats.Smiles;
using RadicalSites.Products;

// All chlorides of propane with one to three chlorine atoms.
IsomerEnumeration isomers = IsomerEnumeration.Of(
    SmilesReader.Parse("CCC"), new IsomerOptions { Halogen = 17, MaximumTimes = 3, Stereo = ProductStereoMode.None });
foreach (IsomerProduct isomer in isomers.Enumerate())
{
    Console.WriteLine($"{isomer.CanonicalSmiles}\t{isomer.Degeneracy}");
}

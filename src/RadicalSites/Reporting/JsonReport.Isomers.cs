using System;
using System.Collections.Generic;
using System.Text.Json;
using RadicalSites.Diagnostics;
using RadicalSites.Molecules;
using RadicalSites.Products;

namespace RadicalSites.Reporting;

public static partial class JsonReport
{
    /// <summary>Writes the record of an enumeration of isomers.</summary>
    /// <param name="writer">Writer of the caller.</param>
    /// <param name="source">Record number, text and name of the input.</param>
    /// <param name="canonicalSmiles">Canonical SMILES of the substrate.</param>
    /// <param name="dataVersion">Version of the data in use.</param>
    /// <param name="enumeration">The enumeration; its products are listed lazily while they are written.</param>
    /// <param name="limit">Most products to list, 0 or more.</param>
    /// <returns>Whether all products were listed; when not, the record carries the remark <c>limit-reached</c>.</returns>
    public static bool Write(
        Utf8JsonWriter writer, RecordSource source, string canonicalSmiles, string dataVersion,
        IsomerEnumeration enumeration, long limit)
    {
        ArgumentNullException.ThrowIfNull(writer);
        ArgumentNullException.ThrowIfNull(source);
        ArgumentNullException.ThrowIfNull(enumeration);
        IsomerOptions options = enumeration.Options;
        Begin(writer, source, isOk: true);
        writer.WriteString("canonicalSmiles"u8, canonicalSmiles);
        writer.WriteString("dataVersion"u8, dataVersion);
        writer.WriteStartObject("enumeration"u8);
        writer.WriteString("halogen"u8, Elements.SymbolOf(options.Halogen));
        writer.WriteNumber("minimumTimes"u8, options.MinimumTimes);
        writer.WriteNumber("maximumTimes"u8, options.MaximumTimes);
        writer.WriteString("stereo"u8, StereoTerm(options.Stereo));
        writer.WriteEndObject();
        writer.WriteStartArray("products"u8);
        bool complete = true;
        foreach (IsomerProduct product in enumeration.Enumerate())
        {
            if (product.Number > limit)
            {
                complete = false;
                break;
            }

            Isomer(writer, enumeration.Molecule, product);
        }

        writer.WriteEndArray();
        writer.WriteBoolean("complete"u8, complete);
        IReadOnlyList<Diagnostic> remarks = complete
            ? enumeration.Diagnostics
            : [.. enumeration.Diagnostics, ProductLimit(limit)];
        End(writer, source, enumeration.Molecule, remarks);
        return complete;
    }

    /// <summary>The remark that an enumeration stopped at its limit.</summary>
    /// <param name="limit">The limit.</param>
    /// <returns>The remark.</returns>
    public static Diagnostic ProductLimit(long limit) =>
        Diagnostic.Create(ProblemCatalogue.General.LimitReached, [], limit, "products");

    internal static string StereoTerm(ProductStereoMode mode) => mode switch
    {
        ProductStereoMode.None => "none",
        ProductStereoMode.Mark => "mark",
        _ => "expand",
    };

    private static void Isomer(Utf8JsonWriter writer, Molecule substrate, IsomerProduct product)
    {
        writer.WriteStartObject();
        writer.WriteNumber("product"u8, product.Number);
        writer.WriteString("smiles"u8, product.CanonicalSmiles);
        writer.WritePropertyName("degeneracy"u8);
        writer.WriteRawValue(product.Degeneracy.ToString(System.Globalization.CultureInfo.InvariantCulture), skipInputValidation: true);
        Atoms(writer, "halogenCarbons"u8, substrate, product.HalogenCarbons);
        Strings(writer, "stereoisomers"u8, product.Stereoisomers);
        Atoms(writer, "atomMap"u8, substrate, product.SubstrateAtoms);
        writer.WriteEndObject();
    }
}

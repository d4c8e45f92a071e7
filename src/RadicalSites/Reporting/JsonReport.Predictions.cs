using System;
using System.Collections.Generic;
using System.Text.Json;
using RadicalSites.Molecules;
using RadicalSites.Products;
using RadicalSites.Selectivity;

namespace RadicalSites.Reporting;

public static partial class JsonReport
{
    /// <summary>Writes the record of a prediction: conditions, sites with shares, products.</summary>
    /// <param name="writer">Writer of the caller.</param>
    /// <param name="source">Record number, text and name of the input.</param>
    /// <param name="prediction">The prediction.</param>
    public static void Write(Utf8JsonWriter writer, RecordSource source, Prediction prediction)
    {
        ArgumentNullException.ThrowIfNull(writer);
        ArgumentNullException.ThrowIfNull(source);
        ArgumentNullException.ThrowIfNull(prediction);
        Begin(writer, source, isOk: true);
        writer.WriteString("canonicalSmiles"u8, prediction.CanonicalSmiles);
        writer.WriteString("dataVersion"u8, prediction.DataVersion);
        Conditions(writer, prediction.Conditions);
        Sites(writer, prediction.Molecule, prediction.Sites);
        Products(writer, prediction.Molecule, prediction.Products);
        End(writer, source, prediction.Molecule, prediction.Diagnostics);
    }

    private static void Conditions(Utf8JsonWriter writer, ReactionConditions conditions)
    {
        writer.WriteStartObject("conditions"u8);
        writer.WriteString("reagent"u8, conditions.Reagent.Id);
        writer.WriteString("carrier"u8, conditions.Reagent.Carrier.Name);
        writer.WriteString("halogen"u8, Elements.SymbolOf(conditions.Reagent.Halogen));
        writer.WriteNumber("temperatureKelvin"u8, conditions.Temperature.Kelvin);
        writer.WriteString("solvent"u8, conditions.Solvent);
        writer.WriteEndObject();
    }

    private static void Products(
        Utf8JsonWriter writer, Molecule substrate, IReadOnlyList<HalogenationProduct> products)
    {
        writer.WriteStartArray("products"u8);
        for (int i = 0; i < products.Count; i++)
        {
            HalogenationProduct product = products[i];
            writer.WriteStartObject();
            writer.WriteNumber("product"u8, product.Number);
            writer.WriteString("smiles"u8, product.CanonicalSmiles);
            Share(writer, product.Share, product.ShareLow, product.ShareHigh);
            writer.WriteNumber("degeneracy"u8, product.Degeneracy);
            Numbers(writer, "sites"u8, product.Sites);
            writer.WriteString("route"u8, SiteWords.Encoded(product.Route));
            writer.WriteString("stereo"u8, SiteWords.Encoded(product.Stereo));
            Strings(writer, "stereoisomers"u8, product.Stereoisomers);
            Atoms(writer, "atomMap"u8, substrate, product.SubstrateAtoms);
            writer.WriteEndObject();
        }

        writer.WriteEndArray();
    }
}

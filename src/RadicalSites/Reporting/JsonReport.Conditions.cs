using System;
using System.Text.Json;
using RadicalSites.Canonical;
using RadicalSites.Products;

namespace RadicalSites.Reporting;

public static partial class JsonReport
{
    /// <summary>Writes the record of a ranking of conditions.</summary>
    /// <param name="writer">Writer of the caller.</param>
    /// <param name="source">Record number, text and name of the input.</param>
    /// <param name="ranking">The ranking.</param>
    public static void Write(Utf8JsonWriter writer, RecordSource source, ConditionRanking ranking)
    {
        ArgumentNullException.ThrowIfNull(writer);
        ArgumentNullException.ThrowIfNull(source);
        ArgumentNullException.ThrowIfNull(ranking);
        Begin(writer, source, isOk: true);
        writer.WriteString("canonicalSmiles"u8, CanonicalSmiles.Write(ranking.Substrate));
        writer.WriteString("dataVersion"u8, ranking.DataVersion);
        writer.WriteString("wanted"u8, ranking.Wanted);
        writer.WriteStartArray("ranking"u8);
        for (int i = 0; i < ranking.Conditions.Count; i++)
        {
            RankedConditions one = ranking.Conditions[i];
            writer.WriteStartObject();
            writer.WriteNumber("rank"u8, i + 1);
            Conditions(writer, one.Conditions);
            writer.WriteBoolean("propagates"u8, one.Propagates);
            writer.WriteBoolean("inRange"u8, one.IsInRange);
            Share(writer, one.Wanted.Share, one.Wanted.ShareLow, one.Wanted.ShareHigh);
            if (one.Rival is { } rival)
            {
                writer.WriteStartObject("rival"u8);
                writer.WriteString("smiles"u8, rival.CanonicalSmiles);
                Number(writer, "share"u8, rival.Share);
                writer.WriteEndObject();
            }
            else
            {
                writer.WriteNull("rival"u8);
            }

            writer.WriteEndObject();
        }

        writer.WriteEndArray();
        End(writer, source, ranking.Substrate, ranking.Diagnostics);
    }
}

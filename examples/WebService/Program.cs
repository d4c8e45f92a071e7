using System;
using System.IO;
using System.Text.Json;
using System.Threading;
using Microsoft.AspNetCore.Builder;
using Microsoft.AspNetCore.Http;
using Microsoft.Extensions.Hosting;
using RadicalSites;
using RadicalSites.Diagnostics;
using RadicalSites.Formats.Smiles;
using RadicalSites.Reporting;
using RadicalSites.Selectivity;

// Limits against hostile input: length of the text, number of atoms.
const int LongestText = 2000;
const int MostAtoms = 500;

WebApplicationBuilder builder = WebApplication.CreateSlimBuilder(args);
WebApplication app = builder.Build();

// One predictor for all requests: it is immutable and thread-safe.
var predictor = new HalogenationPredictor(new ReactionConditions(ReagentCatalogue.Get("Cl2")));
app.MapGet("/predict", async (HttpContext context, CancellationToken cancellation) =>
{
    string smiles = context.Request.Query["smiles"].ToString();
    if (smiles.Length is 0 or > LongestText)
    {
        context.Response.StatusCode = StatusCodes.Status400BadRequest;
        await context.Response.WriteAsync($"Give smiles with 1 to {LongestText} characters.\n", cancellation);
        return;
    }

    if (!SmilesReader.TryParse(smiles, out var molecule, out FormatProblem? problem))
    {
        context.Response.StatusCode = StatusCodes.Status422UnprocessableEntity;
        await context.Response.WriteAsync(problem.Render() + "\n", cancellation);
        return;
    }

    if (molecule.AtomCount > MostAtoms)
    {
        context.Response.StatusCode = StatusCodes.Status413PayloadTooLarge;
        await context.Response.WriteAsync($"At most {MostAtoms} atoms.\n", cancellation);
        return;
    }

    using var buffer = new MemoryStream();
    using (var writer = new Utf8JsonWriter(buffer))
    {
        JsonReport.Write(writer, new RecordSource(1, smiles, null), predictor.Predict(molecule));
    }

    context.Response.ContentType = "application/json";
    await context.Response.BodyWriter.WriteAsync(buffer.ToArray(), cancellation);
});
await app.RunAsync();

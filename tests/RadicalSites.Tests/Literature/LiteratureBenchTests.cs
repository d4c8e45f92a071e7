using System;
using System.Collections.Generic;
using System.IO;
using System.Linq;
using RadicalSites.Selectivity;
using Xunit.Abstractions;

namespace RadicalSites.Tests.Literature;

/// <summary>Published distributions against predictions; the figures are pinned where they stand, not where one would like them.</summary>
public sealed class LiteratureBenchTests(ITestOutputHelper output)
{
    private static readonly BenchReport Report = LiteratureBench.Run();

    [Fact]
    public void Distributions_are_many_and_every_one_is_predicted()
    {
        Assert.True(LiteratureDistributions.Default.Count(static entry => entry.IsMeasured) >= 60);
        Assert.All(Report.Entries, static entry => Assert.Null(entry.Problem));
        Assert.All(LiteratureDistributions.Default, static entry =>
            Assert.InRange(entry.Products.Sum(static product => product.Percent), 99, 101));
    }

    [Fact]
    public void Distributions_no_substrate_is_in_both_splits()
    {
        var fit = LiteratureDistributions.Default.Where(static entry => entry.IsForFitting).Select(static entry => entry.Substrate);
        var test = LiteratureDistributions.Default.Where(static entry => !entry.IsForFitting).Select(static entry => entry.Substrate);
        Assert.Empty(fit.Intersect(test));
    }

    [Fact]
    public void Distributions_sources_are_in_the_bibliography()
    {
        string[] missing = [.. LiteratureDistributions.Default.Select(static entry => entry.Source).Distinct()
            .Where(static key => RadicalSites.Thermochemistry.Bibliography.Find(key) is null)];
        Assert.True(missing.Length == 0, string.Join(' ', missing));
    }

    [Fact]
    public void Run_errors_and_coverage_are_those_pinned()
    {
        foreach (BenchSummary summary in Report.Summaries)
        {
            output.WriteLine($"{summary.Group}: {summary.Entries} entries, {summary.Products} products, "
                + $"MAE {summary.MeanAbsoluteError:0.00} points, coverage {100 * summary.Coverage:0} %");
        }

        BenchSummary test = Report.Find("test")!;
        BenchSummary measured = Report.Find("test, measured")!;
        BenchSummary fit = Report.Find("fit")!;
        Assert.InRange(test.MeanAbsoluteError, 3, 5);
        Assert.InRange(measured.MeanAbsoluteError, 3, 5);
        Assert.InRange(fit.MeanAbsoluteError, 1, 2.5);
        Assert.InRange(test.Coverage, 0.80, 0.95);
        Assert.InRange(fit.Coverage, 0.85, 1.0);
    }

    [Fact]
    public void ToParityCsv_has_one_row_for_each_product()
    {
        string[] lines = Report.ToParityCsv().Split('\n', StringSplitOptions.RemoveEmptyEntries);
        Assert.Equal(1 + Report.Entries.Sum(static entry => entry.Products.Count), lines.Length);
        Assert.All(lines, static line => Assert.Equal(12, line.Split(',').Length));
    }

    /// <summary>The shipped fit follows from the shipped distributions; with RADICALSITES_RENEW_FIT=1 it is written anew.</summary>
    [Fact]
    public void Fit_of_the_shipped_distributions_gives_the_shipped_table()
    {
        CalibrationReport report = SelectivityCalibrator.Fit(
            [.. LiteratureDistributions.Default.Where(static entry => entry.IsForFitting)],
            new CalibrationOptions { Start = SelectivityCalibration.None, Name = "shipped" });
        Assert.Empty(report.Refused);
        Assert.True(report.ErrorAfter < 0.6 * report.ErrorBefore);
        if (Environment.GetEnvironmentVariable("RADICALSITES_RENEW_FIT") == "1")
        {
            string path = Path.Combine(RepositoryRoot.Path, "src", "RadicalSites", "Data", "selectivity_fit.csv");
            File.WriteAllText(path, report.Calibration.ToText(SelectivityCalibrator.RecordOf(report)));
        }

        foreach (SelectivityParameter parameter in SelectivityCalibration.Parameters)
        {
            Assert.Equal(
                SelectivityCalibration.Default.ShiftOf(parameter.Name).Shift, report.Calibration.ShiftOf(parameter.Name).Shift, 0.005);
        }
    }

    /// <summary>Leave one substrate of the fit set out at a time: what a new molecule may expect from these parameters.</summary>
    [Fact]
    public void Fit_without_a_substrate_still_predicts_it()
    {
        MeasuredDistribution[] data = [.. LiteratureDistributions.Default.Where(static entry => entry.IsForFitting)];
        var products = new List<BenchProduct>();
        foreach (IGrouping<string, MeasuredDistribution> substrate in data.GroupBy(static entry => entry.Substrate))
        {
            CalibrationReport report = SelectivityCalibrator.Fit(
                [.. data.Where(entry => entry.Substrate != substrate.Key)],
                new CalibrationOptions { Start = SelectivityCalibration.None });
            products.AddRange(LiteratureBench.Run([.. substrate], new HalogenationOptions { Calibration = report.Calibration })
                .Entries.SelectMany(static entry => entry.Products));
        }

        double error = products.Average(static product => Math.Abs(product.Error));
        double coverage = products.Average(static product => product.IsCovered ? 1.0 : 0);
        output.WriteLine($"left out: MAE {error:0.00} points, coverage {100 * coverage:0} %");
        Assert.InRange(error, 2, 5);
        Assert.InRange(coverage, 0.85, 0.97);
    }
}

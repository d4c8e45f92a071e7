using System;
using RadicalSites.Diagnostics;
using RadicalSites.Selectivity;

namespace RadicalSites.Tests.Literature;

/// <summary>Calibration with a user's ratios. The ratios here are invented.</summary>
public sealed class SelectivityCalibratorTests
{
    private const string Head = "smiles,reagent,celsius,product,percent,sigma\n";

    [Fact]
    public void Fit_to_a_shifted_ratio_moves_the_share_towards_it()
    {
        var data = CalibrationData.Read("ratios", Head + "CCC,Cl2,25,CCCCl,35,1\nCCC,Cl2,25,CC(C)Cl,65,1\nCCCC,Cl2,25,CCCCCl,20,1\nCCCC,Cl2,25,CCC(C)Cl,80,1\n");
        CalibrationReport report = SelectivityCalibrator.Fit(data);
        Assert.Equal(2, report.Experiments);
        Assert.True(report.ErrorAfter < 0.7 * report.ErrorBefore, $"{report.ErrorBefore} to {report.ErrorAfter}");
        CalibratedParameter secondary = Assert.Single(report.Parameters, static parameter => parameter.Name == "Cl/Secondary");
        Assert.True(secondary.After > secondary.Before && secondary.SigmaAfter <= secondary.SigmaBefore);
        (double shift, _) = SelectivityCalibration.Parse("again", report.Calibration.ToText()).ShiftOf("Cl/Secondary");
        Assert.Equal(report.Calibration.ShiftOf("Cl/Secondary").Shift, shift, 3);
        (double other, _) = report.Calibration.ShiftOf("Br/Secondary");
        Assert.Equal(SelectivityCalibration.Default.ShiftOf("Br/Secondary").Shift, other);
    }

    [Fact]
    public void Fit_with_areas_and_sites_equals_fit_with_percent_and_products()
    {
        CalibrationReport percent = SelectivityCalibrator.Fit(CalibrationData.Read(
            "a", Head + "CCC,Cl2,25,CCCCl,40,2\nCCC,Cl2,25,CC(C)Cl,60,2\n"));
        CalibrationReport area = SelectivityCalibrator.Fit(CalibrationData.Read(
            "b", "smiles,reagent,celsius,site,area,sigma\nCCC,Cl2,25,1,2000,100\nCCC,Cl2,25,2,3000,100\n"));
        Assert.Equal(
            percent.Calibration.ShiftOf("Cl/Secondary").Shift, area.Calibration.ShiftOf("Cl/Secondary").Shift, 9);
    }

    [Theory]
    [InlineData("CCC,Cl2,25,CCCCl,40,2\nCCC,Cl2,25,CC(C)Cl,10,2\n", "sum")]
    [InlineData("CCC,Xe2,25,CCCCl,40,2\nCCC,Xe2,25,CC(C)Cl,60,2\n", "no reagent")]
    [InlineData("CCC,I2,25,CCCI,40,2\nCCC,I2,25,CC(C)I,60,2\n", "propagate")]
    [InlineData("CCC,Cl2,25,CCCCCl,40,2\nCCC,Cl2,25,CC(C)Cl,60,2\n", "not a product")]
    [InlineData("CCC,Cl2,25,CCCBr,40,2\nCCC,Cl2,25,CC(C)Cl,60,2\n", "not a product")]
    [InlineData("CCC,Cl2,25,CCCCl,40,0\nCCC,Cl2,25,CC(C)Cl,60,2\n", "standard deviation")]
    [InlineData("CCC,Cl2,1500,CCCCl,40,2\nCCC,Cl2,1500,CC(C)Cl,60,2\n", "outside")]
    [InlineData("C1CC,Cl2,25,CCCCl,40,2\nC1CC,Cl2,25,CC(C)Cl,60,2\n", "SMILES")]
    [InlineData("CCC,Cl2,25,CCCCl,40,2\nCCC,Cl2,25,ClCCC,60,2\n", "twice")]
    [InlineData("CCC,Cl2,25,CCCCl,100,2\n", "ratio")]
    public void Fit_nonsense_is_refused_with_a_reason(string rows, string reason)
    {
        CalibrationReport report = SelectivityCalibrator.Fit(CalibrationData.Read("ratios", Head + rows));
        Assert.Equal(0, report.Experiments);
        Assert.Contains(reason, Assert.Single(report.Refused).Reason, StringComparison.Ordinal);
        Assert.Equal(SelectivityCalibration.Default.ShiftOf("Cl/Secondary"), report.Calibration.ShiftOf("Cl/Secondary"));
    }

    [Theory]
    [InlineData("smiles,reagent,celsius\nCCC,Cl2,25\n", "percent")]
    [InlineData(Head + "CCC,Cl2,25,,40,2\n", "product")]
    [InlineData(Head + "CCC,Cl2,warm,CCCCl,40,2\n", "celsius")]
    [InlineData(Head + "CCC,Cl2,25,CCCCl,-4,2\n", "percent")]
    public void Read_unreadable_table_throws_with_its_column(string text, string column) =>
        Assert.Equal(column, Assert.Throws<TableFormatException>(() => CalibrationData.Read("ratios", text)).Column);

    [Fact]
    public void Fit_contradicting_measurement_is_named_and_weighted_down()
    {
        const string rows = "CCC,Cl2,25,CCCCl,45,1\nCCC,Cl2,25,CC(C)Cl,55,1\nCCCC,Cl2,25,CCCCCl,95,1\nCCCC,Cl2,25,CCC(C)Cl,5,1\nCCCCCC,Cl2,25,CCCCCCCl,19,1\nCCCCCC,Cl2,25,*,81,1\n";
        CalibrationReport report = SelectivityCalibrator.Fit(CalibrationData.Read("ratios", Head + rows));
        Assert.Equal("2", Assert.Single(report.Outliers));
    }
}

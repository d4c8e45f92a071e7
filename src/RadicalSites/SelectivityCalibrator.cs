using System;
using System.Collections.Generic;
using System.Linq;
using MathNet.Numerics.LinearAlgebra;
using RadicalSites.Selectivity;

namespace RadicalSites;

/// <summary>Fits the parameters of the selectivity model to measured distributions.</summary>
/// <remarks>
/// <para>Bayesian update in the linear-Gaussian sense: regularised least squares on 2 arcsin(sqrt(part)), the transform
/// that makes the error of a part independent of its size; the starting values with their standard deviations are the
/// prior, the curvature at the optimum gives the standard deviations after. Measurements that stay far off are weighted
/// down (Huber). Source of the transform and of the weights: common practice, no source.</para>
/// Deterministic. Stateless and safe for use by many threads.
/// </remarks>
public static class SelectivityCalibrator
{
    private const int MostIterations = 40;
    private const double HuberLimit = 2;
    private const double OutlierLimit = 4;
    private const double Step = 1e-4;

    /// <summary>Fits.</summary>
    /// <param name="data">Measured distributions; those that make no sense are refused with a reason.</param>
    /// <param name="options">Options, or <see langword="null"/> for the defaults.</param>
    /// <returns>The calibrated parameters with the errors before and after.</returns>
    public static CalibrationReport Fit(IReadOnlyList<MeasuredDistribution> data, CalibrationOptions? options = null)
    {
        ArgumentNullException.ThrowIfNull(data);
        options ??= new CalibrationOptions();
        var cases = new List<CalibrationCase>(data.Count);
        var refused = new List<CalibrationRefusal>();
        foreach (MeasuredDistribution entry in data)
        {
            if (CalibrationCase.Prepare(entry, options.Table, out string? reason) is { } prepared)
            {
                cases.Add(prepared);
            }
            else
            {
                refused.Add(new CalibrationRefusal(entry.Id, reason ?? "it could not be read"));
            }
        }

        double[] start = options.Start.Shifts.ToArray();
        double[] spread = options.Start.Sigmas.ToArray();
        double[] shifts = (double[])start.Clone();
        double[] sigmas = (double[])spread.Clone();
        int[] active = Active(cases, start, spread);
        if (cases.Count > 0 && active.Length > 0)
        {
            Minimise(cases, active, start, spread, shifts, sigmas, options.LeastSpread);
        }

        var calibration = new SelectivityCalibration(options.Name, shifts, sigmas);
        return new CalibrationReport
        {
            Calibration = calibration,
            Experiments = cases.Count,
            ErrorBefore = MeanError(cases, options.Start),
            ErrorAfter = MeanError(cases, calibration),
            Parameters = Moves(active, start, spread, shifts, sigmas),
            Refused = refused,
            Outliers = [.. cases.Where(entry => Residuals(entry, calibration).Any(static value => Math.Abs(value) > OutlierLimit))
                .Select(static entry => entry.Data.Id)],
        };
    }

    /// <summary>Head of the file that holds a fit: what it was fitted to and how well.</summary>
    internal static string RecordOf(CalibrationReport report) => FormattableString.Invariant(
        $"""
        quantity: shifts of parameters of the selectivity model, added to the values of the tables; sigma: standard deviation after the fit
        fitted to {report.Experiments} entries of the fit set of the table distributions by regularised least squares (SelectivityCalibrator)
        mean absolute error over the fitted products: {report.ErrorBefore:0.00} before, {report.ErrorAfter:0.00} after [percentage points]
        more than four standard deviations off, weighted down: {(report.Outliers.Count == 0 ? "none" : string.Join(' ', report.Outliers))}
        renewed by the test Fit_of_the_shipped_distributions_gives_the_shipped_table with RADICALSITES_RENEW_FIT=1
        """);

    private static CalibratedParameter[] Moves(
        int[] active, double[] start, double[] spread, double[] shifts, double[] sigmas) =>
        [.. active
            .OrderByDescending(index => Math.Abs(shifts[index] - start[index]) / spread[index])
            .ThenBy(static index => index)
            .Select(index => new CalibratedParameter(
                ParameterIndex.All[index].Name, ParameterIndex.All[index].TableValue + start[index], spread[index],
                ParameterIndex.All[index].TableValue + shifts[index], sigmas[index]))];

    // Parameters of the carriers at hand on which at least one measurement bears.
    private static int[] Active(List<CalibrationCase> cases, double[] start, double[] spread)
    {
        var active = new List<int>();
        HashSet<string> carriers = [.. cases.Select(static entry => entry.Carrier)];
        for (int i = 0; i < spread.Length; i++)
        {
            string? carrier = ParameterIndex.All[i].Carrier;
            if (spread[i] > 0 && (carrier is null || carriers.Contains(carrier)) && cases.Any(entry => Bears(entry, i, start, spread[i])))
            {
                active.Add(i);
            }
        }

        return [.. active];
    }

    private static bool Bears(CalibrationCase entry, int index, double[] start, double spread)
    {
        if (ParameterIndex.All[index].Carrier is { } carrier && carrier != entry.Carrier)
        {
            return false;
        }

        double[] moved = (double[])start.Clone();
        moved[index] += spread;
        double[] before = entry.Predict(new SelectivityCalibration("", start, start));
        double[] after = entry.Predict(new SelectivityCalibration("", moved, start));
        return before.Zip(after).Any(static pair => Math.Abs(pair.First - pair.Second) > 1e-6);
    }

    private static void Minimise(
        List<CalibrationCase> cases, int[] active, double[] start, double[] spread, double[] shifts, double[] sigmas, double least)
    {
        double damping = 1e-3;
        double best = Objective(cases, active, start, spread, shifts);
        for (int iteration = 0; iteration < MostIterations; iteration++)
        {
            (Matrix<double> curvature, Vector<double> gradient) = Normal(cases, active, start, spread, shifts);
            Matrix<double> damped = curvature.Clone();
            for (int i = 0; i < active.Length; i++)
            {
                damped[i, i] *= 1 + damping;
            }

            Vector<double> step = damped.Cholesky().Solve(gradient);
            double[] trial = (double[])shifts.Clone();
            for (int i = 0; i < active.Length; i++)
            {
                trial[active[i]] += step[i];
            }

            double value = Objective(cases, active, start, spread, trial);
            if (value < best)
            {
                bool done = best - value < 1e-7 * best;
                trial.CopyTo(shifts, 0);
                best = value;
                damping = Math.Max(1e-9, damping / 5);
                if (done)
                {
                    break;
                }
            }
            else if ((damping *= 8) > 1e8)
            {
                break;
            }
        }

        Matrix<double> covariance = Normal(cases, active, start, spread, shifts).Curvature.Cholesky().Solve(
            Matrix<double>.Build.DenseIdentity(active.Length));
        for (int i = 0; i < active.Length; i++)
        {
            sigmas[active[i]] = Math.Max(least * spread[active[i]], Math.Sqrt(covariance[i, i]));
        }
    }

    private static (Matrix<double> Curvature, Vector<double> Gradient) Normal(
        List<CalibrationCase> cases, int[] active, double[] start, double[] spread, double[] shifts)
    {
        Matrix<double> curvature = Matrix<double>.Build.Dense(active.Length, active.Length);
        Vector<double> gradient = Vector<double>.Build.Dense(active.Length);
        for (int i = 0; i < active.Length; i++)
        {
            double weight = 1 / (spread[active[i]] * spread[active[i]]);
            curvature[i, i] = weight;
            gradient[i] = -weight * (shifts[active[i]] - start[active[i]]);
        }

        foreach (CalibrationCase entry in cases)
        {
            double[] residuals = Residuals(entry, new SelectivityCalibration("", shifts, shifts));
            var slopes = new double[active.Length][];
            for (int i = 0; i < active.Length; i++)
            {
                slopes[i] = Slopes(entry, active[i], shifts, residuals);
            }

            for (int r = 0; r < residuals.Length; r++)
            {
                double weight = Math.Abs(residuals[r]) <= HuberLimit ? 1 : HuberLimit / Math.Abs(residuals[r]);
                for (int i = 0; i < active.Length; i++)
                {
                    if (slopes[i].Length == 0 || slopes[i][r] == 0)
                    {
                        continue;
                    }

                    gradient[i] -= weight * slopes[i][r] * residuals[r];
                    for (int j = 0; j < active.Length; j++)
                    {
                        curvature[i, j] += slopes[j].Length == 0 ? 0 : weight * slopes[i][r] * slopes[j][r];
                    }
                }
            }
        }

        return (curvature, gradient);
    }

    private static double[] Slopes(CalibrationCase entry, int index, double[] shifts, double[] residuals)
    {
        if (ParameterIndex.All[index].Carrier is { } carrier && carrier != entry.Carrier)
        {
            return [];
        }

        double[] moved = (double[])shifts.Clone();
        moved[index] += Step;
        double[] slopes = Residuals(entry, new SelectivityCalibration("", moved, moved));
        for (int i = 0; i < slopes.Length; i++)
        {
            slopes[i] = (slopes[i] - residuals[i]) / Step;
        }

        return slopes;
    }

    private static double Objective(
        List<CalibrationCase> cases, int[] active, double[] start, double[] spread, double[] shifts)
    {
        double sum = 0;
        foreach (int index in active)
        {
            double move = (shifts[index] - start[index]) / spread[index];
            sum += move * move;
        }

        var calibration = new SelectivityCalibration("", shifts, shifts);
        foreach (CalibrationCase entry in cases)
        {
            foreach (double residual in Residuals(entry, calibration))
            {
                double size = Math.Abs(residual);
                sum += size <= HuberLimit ? size * size : (2 * HuberLimit * size) - (HuberLimit * HuberLimit);
            }
        }

        return sum;
    }

    private static double[] Residuals(CalibrationCase entry, SelectivityCalibration calibration)
    {
        double[] predicted = entry.Predict(calibration);
        for (int i = 0; i < predicted.Length; i++)
        {
            double measured = entry.Measured[i];
            double sigma = entry.Data.Products[i].SigmaPercent is { } points
                ? 0.01 * points / Math.Sqrt(Math.Max(measured * (1 - measured), 2.5e-3))
                : UsualSigma(entry.Data.Confidence);
            predicted[i] = (Transform(predicted[i]) - Transform(measured)) / sigma;
        }

        return predicted;
    }

    // On the transformed scale: about 2.5, 4 and 6 points in the middle of the range.
    private static double UsualSigma(string confidence) => confidence switch
    {
        "high" => 0.05,
        "medium" => 0.08,
        _ => 0.12,
    };

    private static double Transform(double part) => 2 * Math.Asin(Math.Sqrt(Math.Clamp(part, 0, 1)));

    private static double MeanError(List<CalibrationCase> cases, SelectivityCalibration calibration)
    {
        double sum = 0;
        int count = 0;
        foreach (CalibrationCase entry in cases)
        {
            double[] predicted = entry.Predict(calibration);
            for (int i = 0; i < predicted.Length; i++)
            {
                sum += 100 * Math.Abs(predicted[i] - entry.Measured[i]);
                count++;
            }
        }

        return count == 0 ? 0 : sum / count;
    }
}

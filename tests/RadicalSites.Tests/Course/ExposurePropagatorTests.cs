using System;
using System.Linq;
using RadicalSites.Course;

namespace RadicalSites.Tests.Course;

/// <summary>The propagator against closed forms of consecutive first-order kinetics (Bateman equations).</summary>
public class ExposurePropagatorTests
{
    [Theory]
    [InlineData(0.001)]
    [InlineData(0.7)]
    [InlineData(3.0)]
    [InlineData(40.0)]
    public void Advance_two_different_rates_equals_the_Bateman_solution(double exposure)
    {
        const double first = 1.7;
        const double second = 0.4;
        var propagator = new ExposurePropagator(3, [(0, 1, first), (1, 2, second)]);

        double[] amounts = propagator.Advance([1, 0, 0], exposure);

        double middle = first / (second - first) * (Math.Exp(-first * exposure) - Math.Exp(-second * exposure));
        AssertClose(Math.Exp(-first * exposure), amounts[0]);
        AssertClose(middle, amounts[1]);
        Assert.Equal(1, amounts.Sum(), 14);
    }

    [Theory]
    [InlineData(0.5)]
    [InlineData(6.25)]
    [InlineData(60.0)]
    public void Advance_equal_rates_gives_the_Poisson_distribution(double exposure)
    {
        // Equal rates make the matrix defective; the exact amounts are x^n exp(-x) / n!.
        const int length = 12;
        var propagator = new ExposurePropagator(
            length + 1, [.. Enumerable.Range(0, length).Select(static i => (i, i + 1, 1.0))]);
        double[] start = new double[length + 1];
        start[0] = 1;

        double[] amounts = propagator.Advance(start, exposure);

        double expected = Math.Exp(-exposure);
        for (int i = 0; i < length; i++)
        {
            AssertClose(expected, amounts[i]);
            expected *= exposure / (i + 1);
        }
    }

    [Fact]
    public void Advance_nearly_equal_rates_does_not_cancel()
    {
        // With rates 1 and 1 + d the middle amount is x exp(-x) (1 - d x / 2 + ...).
        const double difference = 1e-13;
        var propagator = new ExposurePropagator(3, [(0, 1, 1.0), (1, 2, 1.0 + difference)]);

        AssertClose(2 * Math.Exp(-2), propagator.Advance([1, 0, 0], 2)[1]);
    }

    [Fact]
    public void Advance_stiff_chain_keeps_the_stationary_intermediate()
    {
        // Rates 1 and 10^8: B follows A as A / (10^8 - 1), and the sum is conserved.
        var propagator = new ExposurePropagator(3, [(0, 1, 1.0), (1, 2, 1e8)]);

        double[] amounts = propagator.Advance([1, 0, 0], 3);

        AssertClose(Math.Exp(-3), amounts[0], 1e-10);
        AssertClose(Math.Exp(-3) / (1e8 - 1), amounts[1], 1e-10);
        Assert.Equal(1, amounts.Sum(), 13);
    }

    [Fact]
    public void Advance_in_two_parts_equals_one_part()
    {
        var propagator = new ExposurePropagator(4, [(0, 1, 2.0), (0, 2, 0.3), (1, 3, 0.7), (2, 3, 5.0)]);
        double[] start = [1, 0, 0, 0];

        double[] once = propagator.Advance(start, 2.345);
        double[] twice = propagator.Advance(propagator.Advance(start, 1.1), 1.245);

        for (int i = 0; i < 4; i++)
        {
            AssertClose(once[i], twice[i], 1e-13);
        }
    }

    [Theory]
    [InlineData(0.01)]
    [InlineData(0.5)]
    [InlineData(1.7)]
    [InlineData(1.999999)]
    public void Find_returns_the_exposure_where_the_quantity_has_its_target(double target)
    {
        var propagator = new ExposurePropagator(3, [(0, 1, 1.0), (1, 2, 0.01)]);
        double[] start = [1, 0, 0];

        double? exposure = propagator.Find(start, static amounts => amounts[1] + (2 * amounts[2]), target, 1e12);

        Assert.NotNull(exposure);
        double[] amounts = propagator.Advance(start, exposure.Value);
        Assert.Equal(target, amounts[1] + (2 * amounts[2]), 12);
    }

    [Fact]
    public void Find_target_out_of_reach_is_null()
    {
        var propagator = new ExposurePropagator(2, [(0, 1, 1.0)]);

        Assert.Null(propagator.Find([1, 0], static amounts => amounts[1], 1.5, 1e6));
    }

    private static void AssertClose(double expected, double actual, double relative = 5e-13) =>
        Assert.InRange(actual, expected - (relative * expected), expected + (relative * expected));
}

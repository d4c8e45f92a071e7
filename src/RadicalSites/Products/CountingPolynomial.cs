using System;
using System.Numerics;

namespace RadicalSites.Products;

/// <summary>Truncated polynomials with exact coefficients; the exponent counts halogens.</summary>
internal static class CountingPolynomial
{
    /// <summary>The polynomial 1.</summary>
    internal static BigInteger[] One(int degree)
    {
        var one = new BigInteger[degree + 1];
        one[0] = BigInteger.One;
        return one;
    }

    /// <summary>Product of two polynomials, cut at the degree of the first.</summary>
    internal static BigInteger[] Times(BigInteger[] left, BigInteger[] right)
    {
        var product = new BigInteger[left.Length];
        for (int i = 0; i < left.Length; i++)
        {
            if (left[i].IsZero)
            {
                continue;
            }

            for (int j = 0; j < right.Length && i + j < product.Length; j++)
            {
                product[i + j] += left[i] * right[j];
            }
        }

        return product;
    }

    /// <summary>Product with 1 + x^step + x^(2 step) + ... + x^(bound step), cut at the same degree.</summary>
    internal static BigInteger[] TimesGeometric(BigInteger[] left, int step, int bound)
    {
        var product = (BigInteger[])left.Clone();
        for (int repeat = 1; repeat <= bound && (long)repeat * step < left.Length; repeat++)
        {
            int shift = repeat * step;
            for (int i = 0; i + shift < left.Length; i++)
            {
                product[i + shift] += left[i];
            }
        }

        return product;
    }
}

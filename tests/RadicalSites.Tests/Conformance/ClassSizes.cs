using System.Collections.Generic;
using System.Globalization;
using System.Linq;

namespace RadicalSites.Tests.Conformance;

/// <summary>Sizes of classes as the reference tables write them: size*count, ascending.</summary>
internal static class ClassSizes
{
    public static string Of(IEnumerable<int> orbits) => string.Join(' ', orbits
        .CountBy(static orbit => orbit).CountBy(static group => group.Value).OrderBy(static size => size.Key)
        .Select(static size => string.Create(CultureInfo.InvariantCulture, $"{size.Key}*{size.Value}")));
}

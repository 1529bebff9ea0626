using System;
using System.Collections.Generic;
using Lyonium.Equilibria;
using Xunit;

namespace Lyonium.Tests.Equilibria;

public sealed class ExactSumTests
{
    // Numbers of all sizes and the same with the opposite sign in another order: only what is added last remains.
    [Fact]
    public void Value_large_numbers_that_cancel_within_rounding_of_the_exact_sum()
    {
        var random = new Random(RandomMixtures.Seed);
        for (var round = 0; round < 1000; round++)
        {
            var sum = default(ExactSum);
            Rational exact = 0, magnitude = 0;
            var kept = new List<(double Value, int Factor)>();
            for (var i = 0; i < 20; i++)
            {
                var (value, factor) = i < 10
                    ? (RandomMixtures.LogUniform(random, 1e-9, 5), random.Next(-30, 31))
                    : (kept[i - 10].Value * (1 + (random.Next(-2, 3) * 2.220446049250313e-16)), -kept[i - 10].Factor);
                kept.Add((value, factor));
                sum.AddProduct(value, factor);
                exact += factor * Rational.Exactly(value);
                magnitude += (factor * Rational.Exactly(value)).Abs();
            }

            var off = (Rational.Exactly(sum.Value) - exact).Abs();
            var allowed = (Rational.Exactly(1.2e-16) * exact.Abs()) + (Rational.Exactly(1e-30) * magnitude);
            Assert.True((off - allowed).Sign <= 0, "round " + round);
        }
    }
}

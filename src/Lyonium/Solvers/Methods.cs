using System;
using System.Collections.Generic;
using System.Linq;
using Lyonium.Equilibria;

namespace Lyonium.Solvers;

/// <summary>The methods of the library, by the names that records pin.</summary>
public static class Methods
{
    /// <summary>All of them, the exact one first.</summary>
    public static IReadOnlyList<ISolver> All { get; } =
        Array.AsReadOnly<ISolver>([new ExactSolver(), new SuccessiveApproximationSolver(), new DominantAcidSolver()]);

    /// <summary>Finds a method.</summary>
    /// <param name="name">Its name, such as <c>exact</c>.</param>
    /// <returns>The method; <see langword="null"/> where the library has none of that name.</returns>
    public static ISolver? Find(string name) => All.FirstOrDefault(one => string.Equals(one.Name, name, StringComparison.Ordinal));
}

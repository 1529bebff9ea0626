using System;
using System.Collections.Generic;
using System.Linq;
using Lyonium.Equilibria;

namespace Lyonium.Activity;

/// <summary>The models of activity coefficients of the library, by the names that records pin.</summary>
public static class ActivityModels
{
    /// <summary>All of them, the default first.</summary>
    public static IReadOnlyList<IActivityModel> All { get; } = Array.AsReadOnly<IActivityModel>(
    [
        new BatesGuggenheimModel(),
        new SpecificIonModel(),
        new DaviesModel(),
        new DebyeHuckelExtendedModel(),
        new GuntelbergModel(),
        new DebyeHuckelLimitingModel(),
        new IdealModel(),
    ]);

    /// <summary>The default: the Bates–Guggenheim convention for every ion, which the pH standards favour.</summary>
    public static IActivityModel Default => All[0];

    /// <summary>Finds a model.</summary>
    /// <param name="name">Its name, such as <c>davies</c>.</param>
    /// <returns>The model; <see langword="null"/> where the library has none of that name.</returns>
    public static IActivityModel? Find(string name) => All.FirstOrDefault(one => string.Equals(one.Name, name, StringComparison.Ordinal));
}

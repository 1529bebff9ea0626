using System;
using System.Collections.Generic;
using System.Linq;
using Lyonium.Quantities;
using Lyonium.Recipes;

namespace Lyonium.Predictions;

/// <summary>When a caution applies, and what it says.</summary>
/// <param name="Code">A stable word for it.</param>
/// <param name="Groups">One group of substances, or two that must not meet.</param>
/// <param name="FromMolPerL">The strength from which on it applies; <see langword="null"/> where it applies at any strength.</param>
/// <param name="BelowMolPerL">The strength below which it applies; <see langword="null"/> where there is none.</param>
/// <param name="Hazards">GHS hazard statement codes.</param>
/// <param name="HazardsEu">Codes that only the European Union has.</param>
/// <param name="Text">What to do.</param>
/// <param name="Reaction">
/// How the substances consume each other otherwise than by proton exchange, in words; <see langword="null"/> where they do not.
/// </param>
internal sealed record CautionRule(
    string Code,
    IReadOnlyList<string> Groups,
    double? FromMolPerL,
    double? BelowMolPerL,
    IReadOnlyList<string> Hazards,
    IReadOnlyList<string> HazardsEu,
    string Text,
    string? Reaction)
{
    public Caution? Apply(Mixture mixture)
    {
        var because = Because(mixture);
        return because.Length > 0 ? new Caution(Code, Hazards, HazardsEu, Text, because) : null;
    }

    /// <summary>The assumption that does not hold where substances consume each other.</summary>
    public Assumption? ReactionIn(Mixture mixture)
    {
        var because = Reaction is null ? [] : Because(mixture);
        return because.Length > 0
            ? new Assumption(ModelScope.NoReactionButProtonExchange, string.Join(", ", because), null, null, Held: false, Reaction!)
            : null;
    }

    /// <summary>The substances that call for it; empty where it does not apply.</summary>
    private string[] Because(Mixture mixture)
    {
        var first = Members(mixture, Groups[0], part => IsStrongEnough(part) && !(Strength(part) >= BelowMolPerL));
        var second = Groups.Count == 1 ? first : Members(mixture, Groups[1], _ => true);
        var because = first.Concat(second).Distinct(StringComparer.Ordinal).ToArray();
        var met = Groups.Count == 1 || (first.Count > 0 && second.Count > 0 && because.Length > 1);
        return met ? because : [];
    }

    private static List<string> Members(Mixture mixture, string group, Func<PreparedPart, bool> isMember) =>
        mixture.Parts
            .Where(part => part.Substance is not null && part.AmountMol > 0 && part.Substance.Groups.Contains(group, StringComparer.Ordinal) && isMember(part))
            .Select(part => part.Substance!.Name)
            .Distinct(StringComparer.Ordinal)
            .ToList();

    private bool IsStrongEnough(PreparedPart part) => FromMolPerL is not double limit || Strength(part) >= limit;

    // A pure substance from the balance is as strong as can be; an amount in mol is a sum on paper, and its strength is not known.
    private static double Strength(PreparedPart part) => part.Part switch
    {
        SolutionPart => part.AmountMol / part.VolumeL,
        SubstancePart { Taken.Dimension: Dimension.Mass } => double.PositiveInfinity,
        _ => 0,
    };
}

using System.Collections.Generic;
using Lyonium.Tests.Equilibria;

namespace Lyonium.Tests.Solvers;

/// <summary>
/// Mixtures of every kind that a short-cut tells apart, with the pH that the closed formula gives by hand; pKw is 14, activity
/// coefficients are one.
/// </summary>
internal sealed record MethodCase(string Name, MixtureInput Mixture, string Formula, double ByHand)
{
    private const string Acid = "weak acid alone: h = √(K · c)";
    private const string Base = "weak base alone: h = √(Kw · K / c)";
    private const string Ampholyte = "ampholyte: h = √(K₁ · K₂)";
    private const string Both = "weak acid with weak base: h = √(K · c · K′ / c′)";
    private const string Pair = "buffer pair: h = K · filled / empty";
    private const string StrongAcid = "strong acid in excess: h = excess";
    private const string StrongBase = "strong base in excess: h = Kw / excess";

    public static IReadOnlyList<MethodCase> All { get; } =
    [
        // (4.75 + 1) / 2, and (14 + 9.25 − 1) / 2
        new("weak acid", Of(AceticLike(0.1)), Acid, 2.875),
        new("weak base", Of(AmmoniaLike(0.1)), Base, 11.125),
        new("strong acid", Of(Anion(0.01)), StrongAcid, 2),
        new("strong base", Of(Cation(0.01)), StrongBase, 12),
        new("water alone", Of(), "water alone: h = √Kw", 7),

        // 0.1 of base takes 0.05 of strong acid: equal parts, pKa itself; all of it: the salt, (9.25 + 1) / 2; −log 0.05 beyond that.
        new("weak base half neutralised", Of(AmmoniaLike(0.1), Anion(0.05)), Pair, 9.25),
        new("weak base neutralised", Of(AmmoniaLike(0.1), Anion(0.1)), Acid, 5.125),
        new("weak base with strong acid in excess", Of(AmmoniaLike(0.1), Anion(0.15)), StrongAcid, 1.30103),

        // The mirror image: 4.75 − log(0.08 / 0.02); (14 + 4.75 − 1) / 2; 14 + log 0.05.
        new("weak acid one fifth neutralised", Of(AceticLike(0.1), Cation(0.02)), Pair, 4.14794),
        new("weak acid neutralised", Of(AceticLike(0.1), Cation(0.1)), Base, 8.875),
        new("weak acid with strong base in excess", Of(AceticLike(0.1), Cation(0.15)), StrongBase, 12.69897),
        new("strong acid beside a weak one", Of(AceticLike(0.1), Anion(0.01)), StrongAcid, 2),
        new("strong base beside a weak one", Of(AmmoniaLike(0.1), Cation(0.01)), StrongBase, 12),

        // Neither is ruled by the trace.
        new("trace of strong acid in a weak one", Of(AceticLike(0.1), Anion(1e-9)), Acid, 2.875),
        new("trace of strong base in a weak one", Of(AmmoniaLike(0.1), Cation(1e-9)), Base, 11.125),
        new("trace of strong acid in water", Of(Anion(1e-9)), "water alone: h = √Kw", 7),

        // (4.75 + 9.25) / 2; and 0.1 of acid onto 0.05 of base leaves equal parts of the acid and its anion.
        new("salt of weak acid and weak base", Of(AceticLike(0.1), AmmoniaLike(0.1)), Both, 7),
        new("weak acid onto half as much weak base", Of(AceticLike(0.1), AmmoniaLike(0.05)), Pair, 4.75),

        // (2.95 + 5.41) / 2, (6.35 + 10.33) / 2, (7.20 + 12.35) / 2
        new("hydrogen phthalate", Of(PhthalicLike(0.05), Cation(0.05)), Ampholyte, 4.18),
        new("hydrogen carbonate", Of(CarbonicLike(0.1), Cation(0.1)), Ampholyte, 8.34),
        new("hydrogen phosphate", Of(PhosphoricLike(0.1), Cation(0.2)), Ampholyte, 9.775),
        new("carbonate", Of(CarbonicLike(0.1), Cation(0.2)), Base, 11.665),
        new("first step of a ladder", Of(CarbonicLike(0.03)), Acid, 3.93644),
        new("buffer in the middle of a ladder", Of(PhosphoricLike(0.05), Cation(0.075)), Pair, 7.2),
        new("two ladders, the more acidic rules", Of(AceticLike(0.05), PhthalicLike(0.5)), Acid, 1.62551),
        new("two weak acids, the stronger rules", Of(AceticLike(0.1), new LadderInput(0.1, 0, 8.5)), Acid, 2.875),
    ];

    private static MixtureInput Of(params LadderInput[] ladders) => MixtureInput.Of(ladders);

    private static LadderInput AceticLike(double molPerKg) => new(molPerKg, 0, 4.75);

    private static LadderInput AmmoniaLike(double molPerKg) => new(molPerKg, 1, 9.25);

    private static LadderInput CarbonicLike(double molPerKg) => new(molPerKg, 0, 6.35, 10.33);

    private static LadderInput PhthalicLike(double molPerKg) => new(molPerKg, 0, 2.95, 5.41);

    private static LadderInput PhosphoricLike(double molPerKg) => new(molPerKg, 0, 2.15, 7.2, 12.35);

    private static LadderInput Anion(double molPerKg) => new(molPerKg, -1);

    private static LadderInput Cation(double molPerKg) => new(molPerKg, 1);
}

using System;
using System.Collections.Generic;
using System.IO;
using System.Linq;
using Lyonium.Activity;
using Lyonium.Equilibria;
using Lyonium.Predictions;
using Lyonium.Quantities;
using Lyonium.Water;

namespace Lyonium.Qualification;

/// <summary>What a check looks at, its unit, and how the library obtains it.</summary>
/// <param name="Name">The word that check files use.</param>
/// <param name="Unit">The unit, as a UCUM code.</param>
/// <param name="Obtain">Gives the figure, and the ionic strength in mol/kg where there is a mixture.</param>
internal sealed record CheckedQuantity(string Name, string Unit, Func<RunnableCheck, Predictor, (double Value, double? IonicStrength)> Obtain)
{
    public static IReadOnlyList<CheckedQuantity> All { get; } =
    [
        Predicted("pH", "1", prediction => prediction.PH),
        Predicted("buffer-capacity", "mol/L", prediction => prediction.Buffer?.CapacityMolPerL ?? double.NaN),
        Predicted("dilution-value", "1", prediction => prediction.Buffer?.DilutionValue ?? double.NaN),
        Predicted("temperature-coefficient", "K-1", prediction => prediction.Buffer?.TemperatureCoefficientPerK ?? double.NaN),
        new("mean-activity-coefficient", "1", MeanActivityCoefficient.Obtain),
        Of("ion-activity-coefficient", "1", IonActivityCoefficient),
        new("pKa", "1", (check, predictor) => (PKa(check, predictor), null)),
        Of("pKw", "1", check => WaterIonization.PKw(TemperatureK(check), DensityKgPerL(check))),
        Of("water-density", "kg/L", check => WaterDensity.KgPerL(TemperatureK(check))),
        Of("water-permittivity", "1", check => WaterPermittivity.Relative(TemperatureK(check), DensityKgPerL(check))),
        Of("debye-huckel-A", "1", check => DebyeHuckelSlopes.At(TemperatureK(check)).A),
        Of("debye-huckel-B", "1", check => DebyeHuckelSlopes.At(TemperatureK(check)).B),
        Of("debye-huckel-A-by-volume", "1", check => DebyeHuckelSlopes.At(TemperatureK(check)).A * ByVolume(check)),
        Of("debye-huckel-B-by-volume", "1", check => DebyeHuckelSlopes.At(TemperatureK(check)).B * ByVolume(check)),
    ];

    public static CheckedQuantity Find(string name) =>
        All.FirstOrDefault(one => string.Equals(one.Name, name, StringComparison.Ordinal))
        ?? throw new InvalidDataException($"'{name}' is no quantity that is checked.");

    private static CheckedQuantity Of(string name, string unit, Func<RunnableCheck, double> obtain) => new(name, unit, (check, _) => (obtain(check), null));

    private static CheckedQuantity Predicted(string name, string unit, Func<Prediction, double> figure) => new(name, unit, (check, predictor) =>
    {
        var prediction = check.Predict(predictor);
        return (figure(prediction), prediction.IonicStrengthMolPerKg);
    });

    private static double TemperatureK(RunnableCheck check) => check.Number("temperature", Dimension.Temperature);

    private static double DensityKgPerL(RunnableCheck check) =>
        check.Has("density") ? check.Number("density", Dimension.Density) : WaterDensity.KgPerL(TemperatureK(check));

    // With the ionic strength in mol/L instead of mol/kg.
    private static double ByVolume(RunnableCheck check) => 1 / Math.Sqrt(WaterDensity.KgPerL(TemperatureK(check)));

    // The extended equation at 25 °C, for an ion of a given size.
    private static double IonActivityCoefficient(RunnableCheck check)
    {
        const double standardK = 298.15;
        var slopes = DebyeHuckelSlopes.At(standardK);
        var ion = new Equilibrium(
            [Constraint.Total(1)],
            [new Species([new Term(0, 1)], 0, (int)check.Number("charge"), 0, check.Number("ionSize"))],
            new Solvent(standardK, WaterIonization.PKw(standardK), slopes.A, slopes.B));
        var log10Gammas = new double[ion.SpeciesCount];
        new DebyeHuckelExtendedModel().Log10Gammas(ion, check.Number("ionicStrength", Dimension.Molality), log10Gammas, log10Gammas);
        return Math.Pow(10, log10Gammas[Equilibrium.WaterIons]);
    }

    private static double PKa(RunnableCheck check, Predictor predictor)
    {
        var step = predictor.Table.Families.SelectMany(family => family.Steps)
            .FirstOrDefault(one => string.Equals(one.Id, check.Text("step"), StringComparison.Ordinal));
        return step is null ? double.NaN : step.PKa.Value + step.ShiftTo(TemperatureK(check));
    }
}

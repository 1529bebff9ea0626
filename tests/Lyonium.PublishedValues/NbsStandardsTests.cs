using System;
using System.Globalization;
using System.Linq;
using Lyonium.Recipes;
using Xunit;
using Xunit.Abstractions;

namespace Lyonium.PublishedValues;

/// <summary>
/// What the pH standards of the National Bureau of Standards are made of, at 25 °C: Bates, Determination of pH (1973), and NBS SP 260-53
/// (1988), known as read and from memory. Their certified pH stands among the checks that ship with the library.
/// </summary>
public sealed class NbsStandardsTests(ITestOutputHelper output)
{
    [Fact]
    public void Predict_StandardsByWeightPerLitre_AgreesWithAmounts()
    {
        var table = new DeviationTable(
            output,
            "NBS standards weighed in air and made up to 1 L at 25 degC, against the same standards by amount on 1 kg of water",
            "0.005 as asked. The weights are printed to three figures, up to 0.3 %; weighing in air takes 0.06 % more; the solids' volume is "
            + "estimated to 0.3 mL/g, 0.4 % of a litre at most: 0.8 % in molality, which the published dilution values (at most 0.19 for a "
            + "factor of two) turn into 0.002 at most");
        foreach (var standard in StandardSolution.All.Where(one => one.Composition.Has("air_weight_g_L")))
        {
            var inputs = $"{standard.Id}: {standard.Composition.Text("air_weight_g_L")} g/L";
            table.Check(
                standard.Composition, inputs, standard.OnOneKilogramOfWater().PH, standard.WeighedForOneLitre().PH, 0.005);
        }

        table.AssertHolds(7);
    }

    [Fact]
    public void Prepare_StandardsByAmount_HasPublishedMolarity()
    {
        var table = new DeviationTable(
            output,
            "Molarity of the NBS standards in mol/L, from their molality, 25 degC",
            "half of the last printed digit, and the volume of the solids, estimated to 0.3 mL/g");
        foreach (var standard in StandardSolution.All.Where(one => one.Composition.Has("molarity_mol_L")))
        {
            var mixture = standard.OnOneKilogramOfWater().Mixture;
            foreach (var (molality, molarity) in standard.Composition.Several("molality_mol_kg").Zip(standard.Composition.Several("molarity_mol_L")))
            {
                var published = Parse(molarity);
                var halfDigit = 0.5 * Math.Pow(10, -(molarity.Length - 2));
                Judge(table, standard, published, Parse(molality) / mixture.VolumeL, halfDigit + (published * EstimatedPartOfVolume(mixture)));
            }
        }

        table.AssertHolds(10);
    }

    [Fact]
    public void Prepare_StandardsByAmount_HasPublishedDensity()
    {
        var table = new DeviationTable(
            output, "Density of the NBS standards in kg/L at 25 degC", "half of the last printed digit, and the volume of the solids, estimated to 0.3 mL/g");
        foreach (var standard in StandardSolution.All.Where(one => one.Composition.Has("density_25C_kg_L")))
        {
            var mixture = standard.OnOneKilogramOfWater().Mixture;
            var published = standard.Composition.Number("density_25C_kg_L");
            Judge(table, standard, published, mixture.MassKg / mixture.VolumeL, 0.00005 + (published * EstimatedPartOfVolume(mixture)));
        }

        table.AssertHolds(7);
    }

    private static void Judge(DeviationTable table, StandardSolution standard, double published, double obtained, double tolerance)
    {
        if (standard.Composition.Has("volume_caution"))
        {
            table.Report(standard.Composition, $"{standard.Id} ({standard.Composition.Text("volume_caution")})", published, obtained);
        }
        else
        {
            table.Check(standard.Composition, standard.Id, published, obtained, tolerance);
        }
    }

    // The half of the range that the volume of a dissolved solid lies in by common practice, 0.2 to 0.8 mL/g.
    private static double EstimatedPartOfVolume(Mixture mixture) => 0.3 * (mixture.MassKg - mixture.WaterKg) / mixture.VolumeL;

    private static double Parse(string number) => double.Parse(number, CultureInfo.InvariantCulture);
}

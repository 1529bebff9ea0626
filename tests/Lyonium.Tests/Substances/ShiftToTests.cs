using System;
using System.Linq;
using Lyonium.Substances;
using Xunit;

namespace Lyonium.Tests.Substances;

/// <summary>How a pKa is carried to another temperature; against published courses see the published values.</summary>
public sealed class ShiftToTests
{
    private const double GasConstant = 8.31446261815324; // CODATA 2018

    private static readonly DissociationStep[] Steps = [.. SubstanceTable.Default.Families.SelectMany(family => family.Steps)];

    private static readonly DissociationStep[] WithCourse = [.. Steps.Where(step => step.ChangesWithTemperature)];

    // By hand, 25 to 37 Cel, 50 kJ/mol, -200 J/(mol K), R = 8.314463 J/(mol K):
    // 1/310.15 - 1/298.15 = -1.297701e-4 /K;  -50000/8.314463 * -1.297701e-4 = 0.780388
    // 298.15/310.15 - 1 + ln(310.15/298.15) = -0.03869096 + 0.03945934 = 7.68380e-4;  -200/8.314463 * 7.68380e-4 = -0.018483
    // ln K changes by 0.761905, pK by -0.761905/2.302585 = -0.330891; with the enthalpy alone by -0.780388/2.302585 = -0.338918.
    [Fact]
    public void ShiftTo_enthalpyAndHeatCapacity_isTheThreeTermsByHand()
    {
        var alone = TemperatureCourse.Step(TemperatureCourse.Enthalpy);
        var both = TemperatureCourse.Step(TemperatureCourse.Enthalpy + ", " + TemperatureCourse.HeatCapacity);

        Assert.Equal(-0.338918, alone.ShiftTo(310.15), 1e-6);
        Assert.Equal(-0.330891, both.ShiftTo(310.15), 1e-6);
    }

    // By hand: 1000/310.15 + 1 - 3.1015 = 1.1227463 and 1000/298.15 + 1 - 2.9815 = 1.3725164; the difference is -0.2497701, whatever the pKa.
    [Fact]
    public void ShiftTo_equation_isItsDifferenceByHand()
    {
        var step = TemperatureCourse.Step(TemperatureCourse.Equation + ", \"validCelsius\": [ 0, 60 ]", pKa: 1.36);

        Assert.Equal(-0.2497701, step.ShiftTo(310.15), 1e-7);
    }

    // By hand: 1000/310.15 + 2 ln 310.15 = 3.2242463 + 11.4741121 = 14.6983584; 1000/298.15 + 2 ln 298.15 = 14.7492099.
    [Fact]
    public void ShiftTo_equationWithALogarithm_isItsDifferenceByHand()
    {
        var equation = new PKaEquation { OverT = 1000, TimesLnT = 2, Source = Steps[0].PKa.Source, Known = Steps[0].PKa.Known };

        Assert.Equal(14.6983584, equation.At(310.15), 1e-6);
        Assert.Equal(14.7492099, equation.At(298.15), 1e-6);
    }

    [Fact]
    public void ShiftTo_equationBesideAnEnthalpy_goesBefore()
    {
        const string both = TemperatureCourse.Equation + ", \"validCelsius\": [ 0, 60 ]";

        Assert.Equal(TemperatureCourse.Step(both).ShiftTo(310.15), TemperatureCourse.Step(both + ", " + TemperatureCourse.Enthalpy).ShiftTo(310.15));
    }

    [Fact]
    public void ShiftTo_nothingKnown_isZero()
    {
        Assert.All(Steps.Where(step => !step.ChangesWithTemperature), step => Assert.Equal(0, step.ShiftTo(310.15)));
        Assert.All(Steps.Where(step => !step.ChangesWithTemperature), step => Assert.Null(step.ValidRange));
    }

    [Fact]
    public void ShiftTo_itsOwnTemperature_isZeroAndContinuous() => Assert.All(WithCourse, step =>
    {
        Assert.Equal(0, step.ShiftTo(step.PublishedAtK), 1e-14);
        Assert.InRange(Math.Abs(step.ShiftTo(step.PublishedAtK + 1e-6)), 0, 1e-7);
        Assert.InRange(Math.Abs(step.ShiftTo(step.PublishedAtK - 1e-6)), 0, 1e-7);
    });

    // van 't Hoff: d pK/dT = -ΔH/(R T² ln 10).
    [Fact]
    public void ShiftTo_slopeAt25Celsius_isThatOfTheEnthalpy() => Assert.All(WithCourse.Where(step => step.Equation is null), step =>
    {
        const double dT = 0.01;
        var slope = (step.ShiftTo(298.15 + dT) - step.ShiftTo(298.15 - dT)) / (2 * dT);
        var expected = -1000 * step.EnthalpyKJPerMol!.Value / (GasConstant * 298.15 * 298.15 * Math.Log(10));
        Assert.Equal(expected, slope, 1e-8);
    });

    // Published at 20 Cel with the enthalpy at 25 Cel: the way back is the way there.
    [Fact]
    public void ShiftTo_fromAnotherTemperature_takesTheEnthalpyThere()
    {
        const string course = TemperatureCourse.Enthalpy + ", " + TemperatureCourse.HeatCapacity;
        var at25 = TemperatureCourse.Step(course);
        var at20 = TemperatureCourse.Step(course, celsius: 20);

        Assert.Equal(-at25.ShiftTo(293.15), at20.ShiftTo(298.15), 1e-12);
        Assert.Equal(at25.ShiftTo(310.15) - at25.ShiftTo(293.15), at20.ShiftTo(310.15), 1e-12);
    }

    // The rule of docs/decisions/0007: one source for all three where the pKa is the review's; tapso is the one exception.
    [Fact]
    public void Table_pKaOfTheReview_hasTheCourseOfTheReview() => Assert.All(
        WithCourse.Where(step => step.PKa.Source.Key == "goldberg-2002" && step.Id != "tapso:1"),
        step =>
        {
            Assert.Null(step.Equation);
            Assert.Equal("goldberg-2002", step.EnthalpyKJPerMol!.Source.Key);
            Assert.Equal("goldberg-2002", (step.HeatCapacityJPerMolK ?? step.EnthalpyKJPerMol).Source.Key);
        });

    [Fact]
    public void Table_everyCourse_hasItsRange() => Assert.All(WithCourse, step =>
    {
        Assert.Equal(0, step.ValidRange!.Beyond(298.15));
        if (step.Equation is null)
        {
            Assert.Equal(step.HeatCapacityJPerMolK is null ? (10, 40) : (0, 50), Range(step));
        }
    });

    // Å; Kielland's smallest and largest of these ions: caesium 2.5 and magnesium 8.
    [Fact]
    public void Table_ionSizes_areOfChargedForms() => Assert.All(
        SubstanceTable.Default.Families.SelectMany(family => family.Forms.Zip(family.IonSizesAngstrom)).Where(one => one.Second is not null),
        one =>
        {
            Assert.NotEqual(0, one.First.Charge);
            Assert.InRange(one.Second!.Value, 2.5, 8);
            Assert.Equal("kielland-1937", one.Second.Source.Key);
        });

    private static (int Low, int High) Range(DissociationStep step) =>
        ((int)Math.Round(step.ValidRange!.LowK - 273.15), (int)Math.Round(step.ValidRange.HighK - 273.15));
}

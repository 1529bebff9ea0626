using System;
using Lyonium.Equilibria;
using Xunit;

namespace Lyonium.Tests.Equilibria;

/// <summary>What cannot be an equilibrium is refused when it is made.</summary>
public sealed class EquilibriumTests
{
    private static readonly Solvent Water = new(298.15, 14, 0.51, 0.328);

    [Fact]
    public void Constructor_null_throws()
    {
        Assert.Throws<ArgumentNullException>(() => new Equilibrium(null!, [], Water));
        Assert.Throws<ArgumentNullException>(() => new Equilibrium([], null!, Water));
        Assert.Throws<ArgumentNullException>(() => new Equilibrium([], [], null!));
    }

    [Fact]
    public void Constructor_species_of_a_component_that_is_not_there_throws() => Refused(Rung(1, 0, 0, 0));

    [Fact]
    public void Constructor_component_in_no_species_throws() => Refused();

    [Fact]
    public void Constructor_rungs_charged_by_something_else_than_protons_throws() => Refused(Rung(0, 0, -1, 0), Rung(0, 1, 1, 5));

    [Fact]
    public void Constructor_two_rungs_with_the_same_protons_throws() => Refused(Rung(0, 0, -1, 0), Rung(0, 0, -1, 5));

    [Fact]
    public void Constructor_neighbouring_constants_beyond_a_double_throws() => Refused(Rung(0, 0, -1, 0), Rung(0, 1, 0, 300.5));

    [Theory]
    [InlineData(double.NaN)]
    [InlineData(double.PositiveInfinity)]
    [InlineData(-301)]
    public void Constructor_pKw_not_a_usable_number_throws(double pKw) =>
        Assert.Throws<ArgumentException>(() => new Equilibrium([], [], Water with { PKw = pKw }));

    [Fact]
    public void Constructor_water_ions_stand_first()
    {
        var equilibrium = new Equilibrium([Constraint.Total(1)], [Rung(0, 0, -2, 0, 4.5)], Water, 9, 3.5);

        Assert.Equal([1, -1, -2], equilibrium.Charges.ToArray());
        Assert.Equal([9, 3.5, 4.5], equilibrium.IonSizesAngstrom.ToArray());
        Assert.Equal(3, equilibrium.SpeciesCount);
    }

    // The caller's arrays may change afterwards; the equilibrium does not.
    [Fact]
    public void Constructor_copies_what_it_is_given()
    {
        Constraint[] constraints = [Constraint.Total(1)];
        Species[] species = [Rung(0, 0, 0, 0)];
        var equilibrium = new Equilibrium(constraints, species, Water);
        constraints[0] = Constraint.Total(2);
        species[0] = Rung(0, 0, 5, 0);

        Assert.Equal(1, equilibrium.Constraints[0].Value);
        Assert.Equal(0, equilibrium.Species[0].Charge);
    }

    [Theory]
    [InlineData(-1e-300)]
    [InlineData(double.NaN)]
    [InlineData(double.PositiveInfinity)]
    public void Total_not_a_finite_number_of_zero_or_more_throws(double total) =>
        Assert.Throws<ArgumentOutOfRangeException>(() => Constraint.Total(total));

    [Theory]
    [InlineData(double.NaN)]
    [InlineData(double.NegativeInfinity)]
    public void FixedActivity_not_finite_throws(double log10Activity) =>
        Assert.Throws<ArgumentOutOfRangeException>(() => Constraint.FixedActivity(log10Activity));

    [Theory]
    [InlineData(double.NaN)]
    [InlineData(double.PositiveInfinity)]
    public void Species_constant_not_finite_throws(double log10K) =>
        Assert.Throws<ArgumentOutOfRangeException>(() => Rung(0, 0, 0, log10K));

    [Fact]
    public void Species_terms_missing_repeated_or_without_count_throws()
    {
        Assert.Throws<ArgumentNullException>(() => new Species(null!, 0, 0, 0));
        Assert.Throws<ArgumentException>(() => new Species([], 0, 0, 0));
        Assert.Throws<ArgumentException>(() => new Species([new Term(0, 1), new Term(0, 1)], 0, 0, 0));
        Assert.Throws<ArgumentException>(() => new Species([new Term(0, 0)], 0, 0, 0));
        Assert.Throws<ArgumentException>(() => new Species([new Term(-1, 1)], 0, 0, 0));
    }

    [Fact]
    public void Without_solved_status_throws() =>
        Assert.Throws<ArgumentException>(() => SolverOutcome.Without(SolverStatus.Solved, "none"));

    private static Species Rung(int component, int protons, int charge, double log10K, double size = double.NaN) =>
        new([new Term(component, 1)], protons, charge, log10K, size);

    private static void Refused(params Species[] species) =>
        Assert.ThrowsAny<ArgumentException>(() => new Equilibrium([Constraint.Total(0.1)], species, Water));
}

using Lyonium.Substances;

namespace Lyonium.Recipes;

/// <summary>The volume that a dissolved substance takes: from the table, or estimated from its mass.</summary>
/// <param name="LPerMol">The volume, in L/mol.</param>
/// <param name="ErrorLPerMol">By how much an estimate may be off, in L/mol; 0 where the table has the volume.</param>
internal readonly record struct SoluteVolume(double LPerMol, double ErrorLPerMol)
{
    // Common practice, no source: most dissolved solids and liquids take between 0.2 and 0.8 mL/g.
    private const double EstimatedLPerG = 0.5e-3;
    private const double EstimateErrorLPerG = 0.3e-3;

    public static SoluteVolume Of(Substance substance)
    {
        var anhydrousGPerMol = substance.MolarMassGPerMol - substance.CrystalWaterGPerMol;
        return substance.MolarVolumeMLPerMol is { } known
            ? new SoluteVolume(known.Value * 1e-3, 0)
            : new SoluteVolume(EstimatedLPerG * anhydrousGPerMol, EstimateErrorLPerG * anhydrousGPerMol);
    }
}

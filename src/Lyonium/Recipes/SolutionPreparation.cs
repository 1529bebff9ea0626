using Lyonium.Faults;
using Lyonium.Provenance;
using Lyonium.Quantities;
using Lyonium.Substances;

namespace Lyonium.Recipes;

/// <summary>
/// Amount, water, volume and mass of a solution that is poured. With a density the water is the mass less the solute, exactly; without
/// one it is what the solute leaves of the volume, for at most 150 g of solute per litre.
/// </summary>
internal sealed class SolutionPreparation
{
    private const double StrongestWithoutDensityKgPerL = 0.150;

    private readonly SolutionPart _part;
    private readonly Substance _substance;
    private readonly double _waterDensity;
    private readonly string _path;
    private readonly FaultList _faults;
    private readonly double _massPerMol;
    private readonly double _anhydrousPerMol;
    private readonly SoluteVolume _soluteVolume;

    public SolutionPreparation(SolutionPart part, Substance substance, double waterDensity, string path, FaultList faults)
    {
        _part = part;
        _substance = substance;
        _waterDensity = waterDensity;
        _path = path;
        _faults = faults;
        _massPerMol = substance.MolarMassGPerMol * 1e-3;
        _anhydrousPerMol = (substance.MolarMassGPerMol - substance.CrystalWaterGPerMol) * 1e-3;
        _soluteVolume = SoluteVolume.Of(substance);
    }

    private double Strength => _part.Stock.Strength.Computed;

    public PreparedPart? Run()
    {
        // Composition per mol of solute: water and mass follow from the strength; the volume from the density or the solute's volume.
        if (Density(out var tableDensity) is double density)
        {
            return WithDensity(density, tableDensity);
        }

        return tableDensity is null && IsWeakEnough() ? WithSoluteVolume() : Fail();
    }

    // The stock's own density, or the table's where the solute's volume does not do.
    private double? Density(out SourcedValue? tableDensity)
    {
        tableDensity = null;
        if (_part.Stock.Density is { } own)
        {
            return own.Computed;
        }

        if (_soluteVolume.ErrorLPerMol == 0 && IsWeakEnough())
        {
            return null;
        }

        var table = _substance.SolutionDensities;
        tableDensity = _part.Stock.Strength.Dimension switch
        {
            Dimension.MassFraction => table?.AtMassFraction(Strength),
            Dimension.Molality => table?.AtMassFraction(Strength * _massPerMol / (1 + (Strength * _massPerMol))),
            _ => table?.AtMassConcentration(Strength * _massPerMol),
        };
        return tableDensity?.Value;
    }

    private bool IsWeakEnough() => _anhydrousPerMol / VolumePerMol() is > 0 and <= StrongestWithoutDensityKgPerL;

    // L of solution per mol of solute, from the solute's volume.
    private double VolumePerMol() => _part.Stock.Strength.Dimension == Dimension.AmountConcentration
        ? 1 / Strength
        : (WaterPerMol() / _waterDensity) + _soluteVolume.LPerMol;

    // kg of water per mol of solute, where the strength alone says it.
    private double WaterPerMol() => _part.Stock.Strength.Dimension == Dimension.Molality
        ? 1 / Strength
        : (_massPerMol / Strength) - _anhydrousPerMol;

    private PreparedPart? WithDensity(double density, SourcedValue? tableDensity)
    {
        var massPerMol = _part.Stock.Strength.Dimension switch
        {
            Dimension.AmountConcentration => density / Strength,
            Dimension.Molality => (1 / Strength) + _anhydrousPerMol,
            _ => _massPerMol / Strength,
        };
        var amount = _part.Taken.Dimension == Dimension.Mass
            ? _part.Taken.Computed / massPerMol
            : AmountInVolume(density, massPerMol);
        var mass = _part.Taken.Dimension == Dimension.Mass ? _part.Taken.Computed : density * _part.Taken.Computed;
        var volume = _part.Taken.Dimension == Dimension.Mass ? _part.Taken.Computed / density : _part.Taken.Computed;
        var water = mass - (amount * _anhydrousPerMol);
        if (massPerMol < _anhydrousPerMol * (1 - 1e-12))
        {
            _faults.Add(
                FaultKinds.StrongerThanPossible,
                _path,
                _part.Stock.Strength.ToString(),
                ("substance", _substance.Name),
                ("detail", $"with {NumberText.Shortest(density)} kg/L the solute would be heavier than the solution"));
            return null;
        }

        return Part(amount, water < 0 ? 0 : water, volume, mass) with { TableDensity = tableDensity };
    }

    private double AmountInVolume(double density, double massPerMol) =>
        _part.Stock.Strength.Dimension == Dimension.AmountConcentration
            ? Strength * _part.Taken.Computed
            : density * _part.Taken.Computed / massPerMol;

    private PreparedPart WithSoluteVolume()
    {
        var isMolar = _part.Stock.Strength.Dimension == Dimension.AmountConcentration;
        var volumePerMol = VolumePerMol();
        var waterPerMol = isMolar ? _waterDensity * (volumePerMol - _soluteVolume.LPerMol) : WaterPerMol();
        var massPerMol = waterPerMol + _anhydrousPerMol;
        var isMass = _part.Taken.Dimension == Dimension.Mass;
        var taken = _part.Taken.Computed;
        var amount = isMass ? taken / massPerMol : isMolar ? Strength * taken : taken / volumePerMol;
        var volume = isMass ? amount * volumePerMol : taken;
        var water = isMolar && !isMass
            ? _waterDensity * (volume - (amount * _soluteVolume.LPerMol))
            : amount * waterPerMol;
        var error = amount * _soluteVolume.ErrorLPerMol;

        // Molality and mass fraction fix the water of a mass; elsewhere an estimated volume is an error of the water.
        var isWaterExact = isMass && !isMolar;
        return Part(amount, water, volume, isMass ? taken : water + (amount * _anhydrousPerMol)) with
        {
            EstimatedWaterKg = isWaterExact ? 0 : error * _waterDensity,
            EstimatedVolumeL = isMass ? error : 0,
        };
    }

    private PreparedPart Part(double amount, double water, double volume, double mass) => new()
    {
        Part = _part,
        Substance = _substance,
        AmountMol = amount,
        WaterKg = water,
        VolumeL = volume,
        MassKg = mass,
    };

    private PreparedPart? Fail()
    {
        // A mass of a solution of known molality or mass fraction has its water without a density; only its volume is missing.
        if (_part.Taken.Dimension == Dimension.Mass && _part.Stock.Strength.Dimension != Dimension.AmountConcentration)
        {
            return WithSoluteVolume();
        }

        var detail = "it holds more than 150 g of solute per litre, and the table has no density at this strength";
        _faults.Add(
            FaultKinds.NeedsDensity, _path, _part.Stock.Strength.ToString(), ("substance", _substance.Name), ("detail", detail));
        return null;
    }
}

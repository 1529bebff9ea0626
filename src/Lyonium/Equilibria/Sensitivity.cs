using System;
using System.Linq;

namespace Lyonium.Equilibria;

/// <summary>How the pH of an equilibrium moves when the equilibrium is changed a little: the derivative at the answer.</summary>
/// <remarks>
/// The mass and charge balances are differentiated in closed form; the activity coefficients follow the molalities through the model,
/// whose own derivative along the change is a central difference. The two are made consistent by repetition.
/// </remarks>
internal sealed class Sensitivity
{
    private const int MostRounds = 100;
    private const double Consistent = 1e-10;
    private static readonly double Ln10 = Math.Log(10);

    private readonly Equilibrium _equilibrium;
    private readonly IActivityModel _model;
    private readonly double[] _molalities;
    private readonly double _ionicStrength;
    private readonly int[] _fullest;

    // d m / d ln a of each species, activity coefficients held.
    private readonly double[] _perLnActivity;
    private readonly double _chargePerLnActivity;

    public Sensitivity(Equilibrium equilibrium, IActivityModel model, Speciation at)
    {
        _equilibrium = equilibrium;
        _model = model;
        _molalities = at.MolalitiesMolPerKg.ToArray();
        _ionicStrength = at.IonicStrengthMolPerKg;
        var ladders = equilibrium.Ladders;
        _fullest = new int[ladders.Total.Length];
        for (var ladder = 0; ladder < _fullest.Length; ladder++)
        {
            _fullest[ladder] = Fullest(ladders, ladder);
        }

        _perLnActivity = new double[_molalities.Length];
        var logs = new double[_molalities.Length];
        logs[Equilibrium.HydrogenIon] = 1;
        logs[Equilibrium.HydroxideIon] = -1;
        for (var i = 0; i < equilibrium.Species.Count; i++)
        {
            logs[i + Equilibrium.WaterIons] = equilibrium.Species[i].Protons;
        }

        _chargePerLnActivity = Respond(logs, _perLnActivity);
    }

    /// <summary>dpH for each unit of a change; NaN where the activity coefficients do not become consistent.</summary>
    public double PHPer(in Change change)
    {
        var direct = new double[_molalities.Length];
        Direct(change, direct);
        var lnGammas = new double[direct.Length];
        var logs = new double[direct.Length];
        var molalities = new double[direct.Length];
        var miss = new double[direct.Length];
        var lastMiss = new double[direct.Length];
        var relaxation = 1.0;
        for (var round = 0; round < MostRounds; round++)
        {
            for (var i = 0; i < logs.Length; i++)
            {
                logs[i] = direct[i] - lnGammas[i];
            }

            var charge = Respond(logs, molalities) + change.AddedCharge;
            var lnActivity = -charge / _chargePerLnActivity;
            for (var i = 0; i < molalities.Length; i++)
            {
                molalities[i] += lnActivity * _perLnActivity[i];
            }

            Follow(molalities, change.AddedIonicStrength, miss);
            double drive = Math.Abs(lnActivity), largestMiss = 0, alongLast = 0, size = 0;
            for (var i = 0; i < miss.Length; i++)
            {
                drive = Math.Max(drive, Math.Abs(direct[i]));
                miss[i] -= lnGammas[i];
                largestMiss = Math.Max(largestMiss, Math.Abs(miss[i]));
                var turn = miss[i] - lastMiss[i];
                alongLast += lastMiss[i] * turn;
                size += turn * turn;
            }

            if (largestMiss <= Consistent * drive)
            {
                return -lnActivity / Ln10;
            }

            // Aitken's relaxation for vectors: exact after two rounds where all coefficients follow the ionic strength.
            relaxation = round == 0 || size == 0 ? 1 : -relaxation * alongLast / size;
            for (var i = 0; i < miss.Length; i++)
            {
                lnGammas[i] += relaxation * miss[i];
                lastMiss[i] = miss[i];
            }
        }

        return double.NaN;
    }

    private int Fullest(LadderSet ladders, int ladder)
    {
        var fullest = ladders.Start[ladder];
        for (var i = fullest + 1; i < ladders.Start[ladder + 1]; i++)
        {
            fullest = _molalities[ladders.Species[i]] > _molalities[ladders.Species[fullest]] ? i : fullest;
        }

        return fullest;
    }

    // What a change does to ln of each species, the hydrogen-ion activity, the totals' shares and the consistent coefficients held.
    private static void Direct(in Change change, double[] logs)
    {
        for (var i = 0; i < change.Log10K.Length; i++)
        {
            logs[i] += Ln10 * change.Log10K[i];
        }

        for (var i = 0; i < change.Log10Gammas.Length; i++)
        {
            logs[i] -= Ln10 * change.Log10Gammas[i];
        }

        logs[Equilibrium.HydroxideIon] -= Ln10 * change.PKw;
    }

    // From the change of ln of each species as its reaction gives it, to that of its molality: the totals stay. Returns the change of charge.
    // Each ladder is counted from its fullest rung, so that the small rest on the others keeps its digits.
    private double Respond(double[] logs, double[] molalities)
    {
        var hydrogen = _molalities[Equilibrium.HydrogenIon] * logs[Equilibrium.HydrogenIon];
        var hydroxide = _molalities[Equilibrium.HydroxideIon] * logs[Equilibrium.HydroxideIon];
        Array.Clear(molalities, 0, molalities.Length);
        molalities[Equilibrium.HydrogenIon] = hydrogen;
        molalities[Equilibrium.HydroxideIon] = hydroxide;
        var charge = hydrogen - hydroxide;
        var ladders = _equilibrium.Ladders;
        for (var ladder = 0; ladder < _fullest.Length; ladder++)
        {
            var total = ladders.Total[ladder];
            if (total <= 0)
            {
                continue;
            }

            var most = _fullest[ladder];
            var lnOfMost = logs[ladders.Species[most]];
            double mean = 0;
            for (var i = ladders.Start[ladder]; i < ladders.Start[ladder + 1]; i++)
            {
                mean += _molalities[ladders.Species[i]] * (logs[ladders.Species[i]] - lnOfMost) / total;
            }

            for (var i = ladders.Start[ladder]; i < ladders.Start[ladder + 1]; i++)
            {
                var species = ladders.Species[i];
                molalities[species] = _molalities[species] * (logs[species] - lnOfMost - mean);
                charge += (ladders.Charge[i] - ladders.Charge[most]) * molalities[species];
            }
        }

        foreach (var group in _equilibrium.Groups)
        {
            charge += CoupledResponse.Of(group, _molalities, logs, molalities);
        }

        return charge;
    }

    // How ln γ follows a change of the molalities.
    private void Follow(double[] change, double addedIonicStrength, double[] lnGammas)
    {
        const double smallStep = 1e-4;
        const double traceOfIonicStrength = 1e-3;
        var ionicStrength = addedIonicStrength;
        double largest = 0;
        for (var i = 0; i < change.Length; i++)
        {
            ionicStrength += 0.5 * _equilibrium.Charges[i] * _equilibrium.Charges[i] * change[i];
            largest = Math.Max(largest, Math.Abs(change[i]) / Math.Max(_molalities[i], traceOfIonicStrength * _ionicStrength));
        }

        largest = Math.Max(largest, Math.Abs(ionicStrength) / _ionicStrength);
        Array.Clear(lnGammas, 0, lnGammas.Length);
        if (!(largest > 0))
        {
            return;
        }

        var step = smallStep / largest;
        var there = Moved(change, ionicStrength, step);
        var back = Moved(change, ionicStrength, -step);
        for (var i = 0; i < lnGammas.Length; i++)
        {
            lnGammas[i] = Ln10 * (there[i] - back[i]) / (2 * step);
        }
    }

    private double[] Moved(double[] change, double ionicStrengthChange, double step)
    {
        var molalities = new double[change.Length];
        for (var i = 0; i < molalities.Length; i++)
        {
            molalities[i] = Math.Max(0, _molalities[i] + (step * change[i]));
        }

        var log10Gammas = new double[change.Length];
        _model.Log10Gammas(_equilibrium, _ionicStrength + (step * ionicStrengthChange), molalities, log10Gammas);
        return log10Gammas;
    }
}

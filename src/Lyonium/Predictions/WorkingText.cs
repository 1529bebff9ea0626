using System;
using System.Globalization;
using System.Linq;
using System.Text;

namespace Lyonium.Predictions;

/// <summary>Worked steps as plain text.</summary>
internal static class WorkingText
{
    public static string Write(Working working)
    {
        var text = new StringBuilder();
        void Line(string line) => text.Append(line.TrimEnd()).Append('\n');

        Line($"Reactions, constants in mol/kg at the ionic strength of the answer, {Number(working.IonicStrengthMolPerKg)} mol/kg");
        foreach (var one in working.Reactions)
        {
            Line($"  {one.Id}: {one.Equation}");
            Line($"    K = {one.MassAction} = {Number(one.K)}   ({(one.IsFormation ? "log K " + Fixed(-one.PKa) : "pKa " + Fixed(one.PKa))} at infinite dilution)");
        }

        Line("");
        var width = working.Amounts.Max(one => one.Species.Length) + 2;
        Line("Molalities in mol/kg");
        Line("  " + "".PadRight(width) + "start".PadLeft(12) + "change".PadLeft(12) + "equilibrium".PadLeft(13));
        foreach (var one in working.Amounts)
        {
            Line("  " + one.Species.PadRight(width) + Cell(one.StartMolPerKg, 12) + Cell(one.ChangeMolPerKg, 12) + Cell(one.EquilibriumMolPerKg, 13));
        }

        Line("");
        Line("How the pH was found");
        Line($"  {working.Found}");
        if (working.Iterates.Count > 0)
        {
            Line("  estimates of pH: " + string.Join(", ", working.Iterates.Select(one => Fixed(one.PH))));
        }

        var h = working.HydrogenMolPerKg;
        var gamma = working.HydrogenActivityCoefficient;
        Line($"  pH = −log10(γ(H⁺) · [H⁺]) = −log10({Number(gamma)} · {Number(h)}) = {Fixed(-Math.Log10(gamma * h))}");
        Line($"  charges of all species: {Number(working.ChargeMolPerKg)} mol/kg");
        return text.ToString();
    }

    private static string Cell(double? value, int width) => (value is double number ? Number(number) : "–").PadLeft(width);

    private static string Fixed(double value) => value.ToString("F4", CultureInfo.InvariantCulture);

    private static string Number(double value) => value switch
    {
        0 => "0",
        _ when Math.Abs(value) is >= 0.001 and < 1000 => value.ToString("G5", CultureInfo.InvariantCulture),
        _ => value.ToString("0.000e0", CultureInfo.InvariantCulture),
    };
}

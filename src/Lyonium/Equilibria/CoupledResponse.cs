namespace Lyonium.Equilibria;

/// <summary>How a coupled group answers a small change of the constants of its species: its totals, and its fixed activities, stay.</summary>
internal static class CoupledResponse
{
    /// <summary>From the change of ln of each species as its reaction gives it, to that of its molality.</summary>
    /// <param name="group">The group.</param>
    /// <param name="at">The molality of each species of the equilibrium.</param>
    /// <param name="logs">The change of ln of each species at given component activities.</param>
    /// <param name="molalities">Takes the change of the molality of each species of the group.</param>
    /// <returns>The change of the group's charge, in mol/kg.</returns>
    public static double Of(CoupledGroup group, double[] at, double[] logs, double[] molalities)
    {
        var components = group.Components.Length;
        var matrix = new double[components * components];
        var right = new double[components];
        var step = new double[components];
        var counted = new double[components];
        var charged = new double[components];
        for (var i = 0; i < group.Species.Length; i++)
        {
            var molality = at[group.Species[i]];
            for (var c = 0; c < components; c++)
            {
                var count = group.Counts[(i * components) + c];
                right[c] -= count * molality * logs[group.Species[i]];
                for (var d = 0; d <= c; d++)
                {
                    matrix[(c * components) + d] += count * group.Counts[(i * components) + d] * molality;
                }

                // What a unit of each component carries where most of it is: counted from there, the change of charge keeps its digits.
                if (count * molality > counted[c])
                {
                    counted[c] = count * molality;
                    charged[c] = group.Charges[i] / count;
                }
            }
        }

        var newton = new ScaledCholesky(matrix, new double[components]);
        if (!newton.Factor())
        {
            return double.NaN;
        }

        newton.Solve(right, step);
        double charge = 0;
        for (var i = 0; i < group.Species.Length; i++)
        {
            var change = logs[group.Species[i]];
            var fromComponents = 0.0;
            for (var c = 0; c < components; c++)
            {
                change += group.Counts[(i * components) + c] * step[c];
                fromComponents += group.Counts[(i * components) + c] * charged[c];
            }

            molalities[group.Species[i]] = at[group.Species[i]] * change;
            charge += (group.Charges[i] - fromComponents) * molalities[group.Species[i]];
        }

        return charge;
    }
}

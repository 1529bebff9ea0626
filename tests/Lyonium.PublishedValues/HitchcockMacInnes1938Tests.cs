using Lyonium.Predictions;
using Lyonium.Recipes;
using Xunit;
using Xunit.Abstractions;

namespace Lyonium.PublishedValues;

/// <summary>
/// Solutions of known pH at 25 °C by cells: D. I. Hitchcock and A. C. Taylor, J. Am. Chem. Soc. 59 (1937) 1812 and 60 (1938) 2710;
/// D. A. MacInnes, D. Belcher and T. Shedlovsky, J. Am. Chem. Soc. 60 (1938) 1094; known from memory.
/// </summary>
public sealed class HitchcockMacInnes1938Tests(ITestOutputHelper output)
{
    [Fact]
    public void Predict_SolutionByConcentration_AgreesWithPrintedPH()
    {
        var table = new DeviationTable(
            output,
            "Hitchcock and Taylor 1937-38, MacInnes, Belcher and Shedlovsky 1938, 25 degC",
            "0.03: 0.02 as a careful calculation reproduces the standards, and 0.01 by which the scales of the two papers differ from each other and from "
            + "that of today");
        foreach (var row in PublishedRow.ReadAll("hitchcock-macinnes-1938.csv"))
        {
            var builder = Recipe.Named("reference").At("25 Cel").PreparedAt("25 Cel");
            foreach (var part in row.Several("parts_mol_L"))
            {
                builder.Add(part.Split('=')[1] + " mol", part.Split('=')[0]);
            }

            var obtained = new Predictor().Predict(builder.MakeUpTo("1 L").Build()).PH;
            if (row.Caution.Length > 0)
            {
                table.Report(row, row.Text("parts_mol_L"), row.Number("pH"), obtained);
            }
            else
            {
                table.Check(row, row.Text("parts_mol_L"), row.Number("pH"), obtained, 0.03);
            }
        }

        table.AssertHolds(7);
    }
}

using System;
using System.Globalization;
using Lyonium.Faults;
using Lyonium.Predictions;
using Lyonium.Quantities;
using Lyonium.Recipes;
using Lyonium.Records;
using Xunit;

namespace Lyonium.Tests.Quantities;

/// <summary>The machine's culture changes nothing: not what is read, not what is written, not the number.</summary>
public sealed class CultureTests
{
    private const string Text = """
        { "format": "lyonium-recipe/1", "name": "IİıiI", "parts": [
          { "substance": "TRIS HYDROCHLORIDE", "mass": "1.5 g" }, { "substance": "Hydrochloric Acid", "concentration": "0.25 mol/L", "volume": "12.5 mL" } ],
          "makeUpTo": "0.1 L" }
        """;

    [Fact]
    public void Everything_underAHostileCulture_isTheSame()
    {
        var plain = Everything();
        var before = CultureInfo.CurrentCulture;
        try
        {
            CultureInfo.CurrentCulture = Hostile();
            CultureInfo.CurrentUICulture = CultureInfo.CurrentCulture;
            Assert.Equal("1,5", 1.5.ToString(CultureInfo.CurrentCulture));

            Assert.Equal(plain, Everything());
        }
        finally
        {
            CultureInfo.CurrentCulture = before;
            CultureInfo.CurrentUICulture = before;
        }
    }

    private static string Everything()
    {
        var recipe = RecipeJson.Read(Text);
        var prediction = new Predictor().Predict(recipe);
        var refused = Assert.Throws<LyoniumException>(() => RecipeJson.Read(Text.Replace("12.5 mL", "12,5 mL", StringComparison.Ordinal)));
        return string.Join(
            "\n",
            RecipeJson.Write(recipe),
            RecordJson.Write(prediction),
            prediction.ToString(),
            Measure.Parse("-0.5 Cel", Dimension.Temperature).ToString(),
            Stock.Of("HCl", "1.25 mol/L").ToString(),
            FaultsJson.Write(refused.Faults),
            refused.Message);
    }

    internal static CultureInfo Hostile()
    {
        var culture = (CultureInfo)CultureInfo.InvariantCulture.Clone();
        culture.NumberFormat.NumberDecimalSeparator = ",";
        culture.NumberFormat.NumberGroupSeparator = ".";
        culture.NumberFormat.NegativeSign = "minus";
        culture.NumberFormat.PositiveSign = "plus";
        culture.NumberFormat.NaNSymbol = "1";
        culture.NumberFormat.PositiveInfinitySymbol = "2";
        culture.NumberFormat.PercentDecimalSeparator = ",";
        return culture;
    }
}

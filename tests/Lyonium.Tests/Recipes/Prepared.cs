using System.Linq;
using Lyonium.Recipes;
using Lyonium.Records;
using Lyonium.Substances;
using Lyonium.Tests.Records;

namespace Lyonium.Tests.Recipes;

/// <summary>Prepares recipes that are written short, and holds the numbers that hand arithmetic starts from.</summary>
internal static class Prepared
{
    /// <summary>Water at 20 °C and 0.1 MPa, in kg/L, as steam tables print it.</summary>
    public const double Water20 = 0.998207;

    /// <summary>Molar masses in kg/mol, added up from the CIAAW 2021 weights (H 1.008, C 12.011, N 14.007, O 15.999, Na 22.990, Cl 35.45, K 39.098).</summary>
    public const double HCl = 36.458e-3;

    public const double NaCl = 58.440e-3;

    public const double NaOH = 39.997e-3;

    public const double Tris = 121.136e-3;

    public const double CitricAcid = 192.123e-3;

    public const double SodiumCitrate = 258.069e-3;

    public const double TwoWaters = 36.030e-3;

    public static Mixture Of(string parts, string more = "") => Mixture.Prepare(RecipeJson.Read(RecipeText.With(parts, more)), SubstanceTable.Default);

    public static PreparedPart Only(string part) => Of(part + ", { \"substance\": \"water\", \"mass\": \"1 kg\" }").Parts[0];

    public static double AmountOf(this Mixture mixture, string id) => mixture.Amounts.Single(one => one.Substance.Id == id).AmountMol;
}

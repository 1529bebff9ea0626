using System;
using System.Linq;
using Lyonium.Substances;
using Xunit;

namespace Lyonium.Tests.Substances;

/// <summary>Look-up: the names that must be understood, trade synonyms, formulas, and what is not found.</summary>
public sealed class FindTests
{
    private static SubstanceTable Table => SubstanceTable.Default;

    [Theory]
    [InlineData("hydrochloric-acid", "hydrochloric acid", "Hydrochloric Acid", "HYDROCHLORIC ACID", "hydrogen chloride", "muriatic acid", "HCl")]
    [InlineData("hydrobromic-acid", "hydrobromic acid", "HBr")]
    [InlineData("nitric-acid", "nitric acid", "aqua fortis", "HNO3")]
    [InlineData("sulfuric-acid", "sulfuric acid", "sulphuric acid", "oil of vitriol", "H2SO4")]
    [InlineData("perchloric-acid", "perchloric acid", "HClO4")]
    [InlineData("phosphoric-acid", "phosphoric acid", "orthophosphoric acid", "H3PO4")]
    [InlineData("acetic-acid", "acetic acid", "ethanoic acid", "glacial acetic acid", "CH3COOH")]
    [InlineData("formic-acid", "formic acid", "methanoic acid", "HCOOH")]
    [InlineData("lactic-acid", "lactic acid", "2-hydroxypropanoic acid")]
    [InlineData("citric-acid", "citric acid", "anhydrous citric acid")]
    [InlineData("tartaric-acid", "tartaric acid", "L-tartaric acid")]
    [InlineData("malic-acid", "malic acid", "apple acid")]
    [InlineData("oxalic-acid", "oxalic acid", "ethanedioic acid", "H2C2O4")]
    [InlineData("benzoic-acid", "benzoic acid", "C6H5COOH")]
    [InlineData("boric-acid", "boric acid", "orthoboric acid", "H3BO3")]
    [InlineData("ammonia", "ammonia", "ammonium hydroxide", "NH3")]
    [InlineData("sodium-hydroxide", "sodium hydroxide", "caustic soda", "lye", "NaOH")]
    [InlineData("potassium-hydroxide", "potassium hydroxide", "caustic potash", "KOH")]
    [InlineData("calcium-hydroxide", "calcium hydroxide", "slaked lime", "hydrated lime", "Ca(OH)2")]
    [InlineData("sodium-chloride", "sodium chloride", "table salt", "NaCl")]
    [InlineData("potassium-chloride", "potassium chloride", "KCl")]
    [InlineData("sodium-acetate", "sodium acetate", "CH3COONa")]
    [InlineData("ammonium-acetate", "ammonium acetate")]
    [InlineData("sodium-hydrogen-carbonate", "sodium hydrogen carbonate", "sodium bicarbonate", "baking soda", "NaHCO3")]
    [InlineData("sodium-carbonate", "sodium carbonate", "soda ash", "Na2CO3")]
    [InlineData("potassium-dihydrogen-phosphate", "potassium dihydrogen phosphate", "monopotassium phosphate", "KH2PO4")]
    [InlineData("disodium-hydrogen-phosphate", "disodium hydrogen phosphate", "Na2HPO4")]
    [InlineData("potassium-hydrogen-phthalate", "potassium hydrogen phthalate", "KHP", "potassium biphthalate")]
    [InlineData("potassium-hydrogen-tartrate", "potassium hydrogen tartrate", "cream of tartar", "potassium bitartrate")]
    [InlineData("potassium-dihydrogen-citrate", "potassium dihydrogen citrate", "monopotassium citrate")]
    [InlineData("trisodium-citrate-dihydrate", "trisodium citrate dihydrate", "sodium citrate dihydrate", "Trisodium-Citrate  Dihydrate")]
    [InlineData("potassium-tetroxalate-dihydrate", "potassium tetroxalate dihydrate")]
    [InlineData("sodium-tetraborate-decahydrate", "sodium tetraborate decahydrate", "borax", "Na2B4O7.10H2O", "Na2B4O7·10H2O")]
    [InlineData("tris", "tris", "TRIS", "trometamol", "tromethamine", "THAM", "tris(hydroxymethyl)aminomethane")]
    [InlineData("tris-hydrochloride", "tris hydrochloride", "tris HCl", "Tris-HCl")]
    public void Find_eachName_givesTheId(string id, params string[] names)
    {
        foreach (var name in names.Append(id).Append("  " + names[0].ToUpperInvariant() + " "))
        {
            var found = Table.Find(name);

            Assert.True(found.Success, found.Success ? "" : found.Faults[0].ToString());
            Assert.Equal(id, found.Value.Id);
        }
    }

    [Fact]
    public void Find_everyNameOfTheTable_givesItsOwner()
    {
        foreach (var substance in Table.Substances)
        {
            foreach (var name in substance.Synonyms.Append(substance.Name).Append(substance.Id))
            {
                Assert.Same(substance, Table.Find(name).Value);
                Assert.Same(substance, Table.Find(name.ToUpperInvariant()).Value);
            }
        }
    }

    [Fact]
    public void Find_everyFormula_givesItsOwnerOrTheCandidates()
    {
        foreach (var group in Table.Substances.GroupBy(one => one.Formula.Text, StringComparer.Ordinal))
        {
            var found = Table.Find(group.Key);
            if (group.Count() == 1 && found.Success)
            {
                Assert.Same(group.Single(), found.Value);
            }
            else
            {
                Assert.Equal("LYO0302", Assert.Single(found.Faults).Code);
                Assert.All(group, one => Assert.Contains(one.Name, found.Faults[0].Remedy, StringComparison.Ordinal));
                FaultText.Check(found.Faults);
            }
        }
    }

    [Fact]
    public void Find_ambiguousFormula_listsTheCandidates()
    {
        // One formula, several acids: cis and trans, or mirror forms.
        var shared = Table.Substances.GroupBy(one => one.Formula.Text, StringComparer.Ordinal).First(group => group.Count() > 1);

        var found = Table.Find(shared.Key);

        Assert.Equal("LYO0302", Assert.Single(found.Faults).Code);
        Assert.All(shared, one => Assert.Contains(one.Name, found.Faults[0].Arguments["candidates"], StringComparison.Ordinal));
    }

    [Theory]
    [InlineData("nacl", "NaCl")]
    [InlineData("hydrocloric acid", "hydrochloric acid")]
    [InlineData("acetic acd", "acetic acid")]
    [InlineData("sodium hydroxid", "sodium hydroxide")]
    [InlineData("ammonium acetat", "ammonium acetate")]
    public void Find_aTypingError_suggestsTheNearestName(string typed, string meant)
    {
        var fault = Assert.Single(Table.Find(typed).Faults);

        Assert.Equal("LYO0301", fault.Code);
        Assert.Contains("'" + meant + "'", fault.Remedy, StringComparison.Ordinal);
        FaultText.Check([fault]);
    }

    [Theory]
    [InlineData("")]
    [InlineData(" ")]
    [InlineData("-")]
    [InlineData("unobtainium fluxate of the seventh kind")]
    [InlineData("{suggestion}")]
    [InlineData("'; DROP TABLE substances; --")]
    public void Find_nonsense_isUnknown(string typed)
    {
        var fault = Assert.Single(Table.Find(typed).Faults);

        Assert.Equal("LYO0301", fault.Code);
        FaultText.Check([fault]);
    }

    [Fact]
    public void Find_formula_isCaseSensitive()
    {
        Assert.False(Table.Find("HCL").Success);
        Assert.False(Table.Find("NACL").Success);
        Assert.False(Table.Find("h2so4").Success);
    }

    [Fact]
    public void Find_aHugeName_isUnknownAtOnce()
    {
        var watch = System.Diagnostics.Stopwatch.StartNew();

        Assert.Equal("LYO0301", Table.Find(new string('a', 2_000_000)).Faults[0].Code);
        Assert.True(watch.Elapsed < TimeSpan.FromSeconds(1), $"{watch.Elapsed}");
    }

    [Fact]
    public void Find_null_throws() => Assert.Throws<ArgumentNullException>(() => Table.Find(null!));

    [Theory]
    [InlineData("oxlaic", "oxalic acid")]
    [InlineData("acetc", "acetic acid")]
    public void Find_misspelt_without_the_word_acid_suggests_the_acid(string wanted, string nearest) =>
        Assert.Contains($"'{nearest}'", Assert.Single(SubstanceTable.Default.Find(wanted).Faults).Remedy, System.StringComparison.Ordinal);
}

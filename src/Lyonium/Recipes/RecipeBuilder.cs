using System;
using Lyonium.Faults;
using Lyonium.Quantities;
using Lyonium.Substances;
using UnitsNet;

namespace Lyonium.Recipes;

/// <summary>Builds a recipe line by line; <see cref="Build()"/> tells every fault at once.</summary>
/// <remarks>
/// Overloads take UnitsNet quantities or UCUM text (<c>"12.5 mL"</c>). A fault names its place as the JSON of the recipe would have it.
/// Not thread-safe; a builder belongs to one thread and makes one recipe.
/// </remarks>
public sealed class RecipeBuilder
{
    private readonly RecipeDraft _draft = new(new FaultList(), "$");

    internal RecipeBuilder(string name) => _draft.Name = name;

    /// <summary>Gives the recipe the host's id.</summary>
    /// <param name="id">The id.</param>
    /// <returns>This builder.</returns>
    public RecipeBuilder WithId(string id)
    {
        _draft.Id = id ?? throw new ArgumentNullException(nameof(id));
        return this;
    }

    /// <summary>Says at which temperature the pH is asked for; 25 °C unless said.</summary>
    /// <param name="temperature">The temperature as UCUM text, 0 to 100 Cel.</param>
    /// <returns>This builder.</returns>
    public RecipeBuilder At(string temperature) => At(Read(temperature, Dimension.Temperature, "$.temperature"));

    /// <summary>Says at which temperature the pH is asked for; 25 °C unless said.</summary>
    /// <param name="temperature">The temperature, 0 to 100 °C.</param>
    /// <returns>This builder.</returns>
    public RecipeBuilder At(Temperature temperature) => At(UnitsNetDoor.From(temperature));

    /// <summary>Says at which temperature volumes are measured; 20 °C unless said.</summary>
    /// <param name="temperature">The temperature as UCUM text, 0 to 100 Cel.</param>
    /// <returns>This builder.</returns>
    public RecipeBuilder PreparedAt(string temperature) => PreparedAt(Read(temperature, Dimension.Temperature, "$.preparedAt"));

    /// <summary>Says at which temperature volumes are measured; 20 °C unless said.</summary>
    /// <param name="temperature">The temperature, 0 to 100 °C.</param>
    /// <returns>This builder.</returns>
    public RecipeBuilder PreparedAt(Temperature temperature) => PreparedAt(UnitsNetDoor.From(temperature));

    /// <summary>Pours a volume (or a mass) of a stock.</summary>
    /// <param name="volumeOrMass">How much, as UCUM text; zero or more.</param>
    /// <param name="stock">The stock.</param>
    /// <returns>This builder.</returns>
    public RecipeBuilder Pour(string volumeOrMass, Stock stock) => Pour(ReadVolumeOrMass(volumeOrMass), stock);

    /// <summary>Pours a volume of a stock.</summary>
    /// <param name="volume">How much, zero or more.</param>
    /// <param name="stock">The stock.</param>
    /// <returns>This builder.</returns>
    public RecipeBuilder Pour(Volume volume, Stock stock) => Pour(UnitsNetDoor.From(volume), stock);

    /// <summary>Pours a mass of a stock.</summary>
    /// <param name="mass">How much, zero or more.</param>
    /// <param name="stock">The stock.</param>
    /// <returns>This builder.</returns>
    public RecipeBuilder Pour(Mass mass, Stock stock) => Pour(UnitsNetDoor.From(mass), stock);

    /// <summary>Pours a volume (or a mass) of what another recipe makes.</summary>
    /// <param name="volumeOrMass">How much, as UCUM text; zero or more, and no more than the recipe makes.</param>
    /// <param name="recipe">The recipe.</param>
    /// <returns>This builder.</returns>
    public RecipeBuilder Pour(string volumeOrMass, Recipe recipe) => Pour(ReadVolumeOrMass(volumeOrMass), recipe);

    /// <summary>Pours a volume of what another recipe makes.</summary>
    /// <param name="volume">How much, zero or more, and no more than the recipe makes.</param>
    /// <param name="recipe">The recipe.</param>
    /// <returns>This builder.</returns>
    public RecipeBuilder Pour(Volume volume, Recipe recipe) => Pour(UnitsNetDoor.From(volume), recipe);

    /// <summary>Pours a mass of what another recipe makes.</summary>
    /// <param name="mass">How much, zero or more, and no more than the recipe makes.</param>
    /// <param name="recipe">The recipe.</param>
    /// <returns>This builder.</returns>
    public RecipeBuilder Pour(Mass mass, Recipe recipe) => Pour(UnitsNetDoor.From(mass), recipe);

    /// <summary>Pours all that another recipe makes.</summary>
    /// <param name="recipe">The recipe.</param>
    /// <returns>This builder.</returns>
    public RecipeBuilder PourAll(Recipe recipe) => Pour(RecipePart.All, recipe);

    /// <summary>Pours a volume (or a mass) of water.</summary>
    /// <param name="volumeOrMass">How much, as UCUM text; zero or more.</param>
    /// <returns>This builder.</returns>
    public RecipeBuilder PourWater(string volumeOrMass) => PourWater(ReadVolumeOrMass(volumeOrMass));

    /// <summary>Pours a volume of water.</summary>
    /// <param name="volume">How much, zero or more.</param>
    /// <returns>This builder.</returns>
    public RecipeBuilder PourWater(Volume volume) => PourWater(UnitsNetDoor.From(volume));

    /// <summary>Pours a mass of water.</summary>
    /// <param name="mass">How much, zero or more.</param>
    /// <returns>This builder.</returns>
    public RecipeBuilder PourWater(Mass mass) => PourWater(UnitsNetDoor.From(mass));

    /// <summary>Weighs a mass of a pure substance.</summary>
    /// <param name="mass">How much, as UCUM text; zero or more.</param>
    /// <param name="substance">A name, id or formula of the table.</param>
    /// <returns>This builder.</returns>
    public RecipeBuilder Weigh(string mass, string substance) =>
        AddSubstance(Read(mass, Dimension.Mass, _draft.NextPath + ".mass"), substance, purity: null);

    /// <summary>Weighs a mass of a pure substance.</summary>
    /// <param name="mass">How much, as UCUM text; zero or more.</param>
    /// <param name="substance">A name, id or formula of the table.</param>
    /// <param name="purity">The mass fraction of the substance in what is weighed, such as <c>"99.5 %"</c>; above 0 and up to 110 %.</param>
    /// <returns>This builder.</returns>
    public RecipeBuilder Weigh(string mass, string substance, string purity) =>
        AddSubstance(Read(mass, Dimension.Mass, _draft.NextPath + ".mass"), substance, purity ?? throw new ArgumentNullException(nameof(purity)));

    /// <summary>Weighs a mass of a pure substance.</summary>
    /// <param name="mass">How much, zero or more.</param>
    /// <param name="substance">A name, id or formula of the table.</param>
    /// <returns>This builder.</returns>
    public RecipeBuilder Weigh(Mass mass, string substance) =>
        AddSubstance(UnitsNetDoor.From(mass), substance, purity: null);

    /// <summary>Weighs a mass of a pure substance.</summary>
    /// <param name="mass">How much, zero or more.</param>
    /// <param name="substance">A name, id or formula of the table.</param>
    /// <param name="purity">The mass fraction of the substance in what is weighed, such as <c>"99.5 %"</c>; above 0 and up to 110 %.</param>
    /// <returns>This builder.</returns>
    public RecipeBuilder Weigh(Mass mass, string substance, string purity) =>
        AddSubstance(UnitsNetDoor.From(mass), substance, purity ?? throw new ArgumentNullException(nameof(purity)));

    /// <summary>Adds an amount of a pure substance.</summary>
    /// <param name="amount">How much, as UCUM text such as <c>"0.05 mol"</c>; zero or more.</param>
    /// <param name="substance">A name, id or formula of the table.</param>
    /// <returns>This builder.</returns>
    public RecipeBuilder Add(string amount, string substance) =>
        AddSubstance(Read(amount, Dimension.Amount, _draft.NextPath + ".amount"), substance, purity: null);

    /// <summary>Adds an amount of a pure substance.</summary>
    /// <param name="amount">How much, zero or more.</param>
    /// <param name="substance">A name, id or formula of the table.</param>
    /// <returns>This builder.</returns>
    public RecipeBuilder Add(AmountOfSubstance amount, string substance) =>
        AddSubstance(UnitsNetDoor.From(amount), substance, purity: null);

    /// <summary>Fills up with water to a mark (or to a mass).</summary>
    /// <param name="volumeOrMass">The final volume or mass as UCUM text, above what is in already.</param>
    /// <returns>This builder.</returns>
    public RecipeBuilder MakeUpTo(string volumeOrMass) =>
        MakeUpTo(Read(volumeOrMass, IsMass(volumeOrMass) ? Dimension.Mass : Dimension.Volume, "$.makeUpTo"));

    /// <summary>Fills up with water to a mark.</summary>
    /// <param name="volume">The final volume, above what is in already.</param>
    /// <returns>This builder.</returns>
    public RecipeBuilder MakeUpTo(Volume volume) => MakeUpTo(UnitsNetDoor.From(volume));

    /// <summary>Fills up with water to a mass.</summary>
    /// <param name="mass">The final mass, above what is in already.</param>
    /// <returns>This builder.</returns>
    public RecipeBuilder MakeUpTo(Mass mass) => MakeUpTo(UnitsNetDoor.From(mass));

    /// <summary>Builds the recipe, with substances of the built-in table.</summary>
    /// <returns>The recipe.</returns>
    /// <exception cref="LyoniumException">Something is refused; every fault is listed.</exception>
    public Recipe Build() => Build(SubstanceTable.Default);

    /// <summary>Builds the recipe.</summary>
    /// <param name="table">The table whose substances it names.</param>
    /// <returns>The recipe.</returns>
    /// <exception cref="ArgumentNullException"><paramref name="table"/> is <see langword="null"/>.</exception>
    /// <exception cref="LyoniumException">Something is refused; every fault is listed.</exception>
    public Recipe Build(SubstanceTable table) => TryBuild(table).GetValueOrThrow();

    /// <summary>Builds the recipe, with substances of the built-in table, or tells every fault as a value.</summary>
    /// <returns>The recipe, or every fault.</returns>
    public Attempt<Recipe> TryBuild() => TryBuild(SubstanceTable.Default);

    /// <summary>Builds the recipe, or tells every fault as a value.</summary>
    /// <param name="table">The table whose substances it names.</param>
    /// <returns>The recipe, or every fault.</returns>
    /// <exception cref="ArgumentNullException"><paramref name="table"/> is <see langword="null"/>.</exception>
    public Attempt<Recipe> TryBuild(SubstanceTable table) => _draft.Build(table ?? throw new ArgumentNullException(nameof(table)));

    private static bool IsMass(string text) => MeasureReader.DimensionOf(text ?? throw new ArgumentNullException(nameof(text))) == Dimension.Mass;

    private Measure? Read(string text, Dimension dimension, string path) =>
        MeasureReader.Read(text ?? throw new ArgumentNullException(nameof(text)), dimension, path, _draft.Faults);

    private Measure? ReadVolumeOrMass(string text) =>
        IsMass(text)
            ? Read(text, Dimension.Mass, _draft.NextPath + ".mass")
            : Read(text, Dimension.Volume, _draft.NextPath + ".volume");

    private RecipeBuilder At(Measure? temperature)
    {
        _draft.SetTemperature(temperature);
        return this;
    }

    private RecipeBuilder PreparedAt(Measure? temperature)
    {
        _draft.SetPreparedAt(temperature);
        return this;
    }

    private RecipeBuilder Pour(Measure? taken, Stock stock)
    {
        _ = stock ?? throw new ArgumentNullException(nameof(stock));
        _draft.AddStock(stock);
        _draft.AddSolution(stock, taken, id: null);
        return this;
    }

    private RecipeBuilder Pour(Measure? taken, Recipe recipe)
    {
        _draft.AddRecipe(recipe ?? throw new ArgumentNullException(nameof(recipe)), taken, id: null);
        return this;
    }

    private RecipeBuilder PourWater(Measure? taken)
    {
        _draft.AddWater(taken, id: null);
        return this;
    }

    private RecipeBuilder AddSubstance(Measure? taken, string substance, string? purity)
    {
        var fraction = purity is null ? null : Read(purity, Dimension.MassFraction, _draft.NextPath + ".purity");
        _draft.AddSubstance(substance ?? throw new ArgumentNullException(nameof(substance)), taken, fraction, id: null);
        return this;
    }

    private RecipeBuilder MakeUpTo(Measure? mark)
    {
        _draft.SetMakeUpTo(mark);
        return this;
    }
}

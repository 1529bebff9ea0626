using System;
using System.Collections.Generic;
using System.Globalization;
using System.Linq;
using Lyonium.Faults;
using Lyonium.Quantities;
using Lyonium.Substances;

namespace Lyonium.Recipes;

/// <summary>A recipe while it is written, in code or from JSON: the one place where its rules are checked.</summary>
internal sealed class RecipeDraft
{
    private const double ZeroCelsiusK = 273.15;
    private const double HundredCelsiusK = 373.15;

    /// <summary>What a poured part must say.</summary>
    public const string VolumeOrMass = "a volume or a mass";

    private readonly List<Part> _parts = [];

    // Parts that were refused keep their place, so that paths stay those of the input.
    private readonly List<int> _positionOf = [];
    private int _positions;

    private readonly List<Stock> _stocks = [];
    private readonly Dictionary<string, Stock> _stocksByName = new(StringComparer.Ordinal);
    private Measure? _temperature;
    private Measure? _preparedAt;
    private Measure? _makeUpTo;

    private readonly string _root;

    // What was refused elsewhere in a document does not refuse a recipe inside it.
    private readonly int _faultsBefore;

    /// <summary>Starts a draft.</summary>
    /// <param name="faults">Where faults are told.</param>
    /// <param name="root">Where the recipe stands: <c>$</c>, or the place of a recipe inside another.</param>
    public RecipeDraft(FaultList faults, string root)
    {
        Faults = faults;
        _root = root;
        _faultsBefore = faults.Count;
    }

    public FaultList Faults { get; }

    public string? Id { get; set; }

    public string? Name { get; set; }

    public string? Notes { get; set; }

    /// <summary>Where the next part will stand.</summary>
    public string NextPath => PathOf(_root, _positions);

    public static string PathOf(string root, int position) => root + ".parts[" + position.ToString(CultureInfo.InvariantCulture) + "]";

    public void SetTemperature(Measure? temperature) => _temperature = Between0And100(temperature, _root + ".temperature");

    public void SetPreparedAt(Measure? temperature) => _preparedAt = Between0And100(temperature, _root + ".preparedAt");

    public void SetMakeUpTo(Measure? mark)
    {
        if (mark is null || MeasureReader.Check(mark, _root + ".makeUpTo", mark.ToString(), Faults) is null)
        {
            return;
        }

        if (mark.Computed == 0)
        {
            Faults.Add(FaultKinds.Zero, _root + ".makeUpTo", mark.ToString(), MeasureReader.Expected(mark.Dimension));
        }
        else if (_makeUpTo is not null)
        {
            Faults.Add(FaultKinds.Contradictory, _root + ".makeUpTo", $"the marks {_makeUpTo} and {mark}");
        }

        _makeUpTo = mark;
    }

    public void AddStock(Stock stock)
    {
        if (stock.Name is null)
        {
            return;
        }

        if (!_stocksByName.TryGetValue(stock.Name, out var same))
        {
            _stocks.Add(stock);
            _stocksByName.Add(stock.Name, stock);
        }
        else if (!same.Equals(stock))
        {
            Faults.Add(FaultKinds.DuplicateName, _root + ".stocks", stock.Name);
        }
    }

    public void AddSolution(Stock? stock, Measure? taken, string? id)
    {
        if (stock is { Name: null } && WaterName.Is(stock.Substance))
        {
            RefuseBesideWater(Stock.StrengthProperty(stock.Strength.Dimension));
            stock = null;
        }

        if (stock is not null && Checked(taken) is { } sound)
        {
            AddPart(new SolutionPart(stock, sound, id));
        }

        _positions++;
    }

    public void AddSubstance(string? substance, Measure? taken, Measure? purity, string? id)
    {
        if (substance is not null && WaterName.Is(substance))
        {
            AddWaterAsSubstance(taken, purity, id);
            return;
        }

        CheckPurity(purity);
        if (substance is not null && Checked(taken) is { } sound)
        {
            AddPart(new SubstancePart(substance, sound, purity, id));
        }

        _positions++;
    }

    // Water is taken by volume or mass, and has no purity.
    private void AddWaterAsSubstance(Measure? taken, Measure? purity, string? id)
    {
        if (purity is not null)
        {
            RefuseBesideWater("purity");
        }

        if (taken is { Dimension: Dimension.Amount })
        {
            RefuseBesideWater("amount");
            Faults.Add(FaultKinds.Incomplete, NextPath, "", ("missing", VolumeOrMass));
            taken = null;
        }

        AddWater(taken, id);
    }

    private void RefuseBesideWater(string property) => Faults.Add(FaultKinds.Contradictory, NextPath, "water and " + property);

    public void AddWater(Measure? taken, string? id)
    {
        if (Checked(taken) is { } sound)
        {
            AddPart(new WaterPart(sound, id));
        }

        _positions++;
    }

    /// <summary>Adds a recipe, or a volume or mass of it.</summary>
    public void AddRecipe(Recipe? recipe, Measure? taken, string? id)
    {
        if (recipe?.Nesting >= Recipe.MostNesting)
        {
            Faults.Add(
                FaultKinds.NestedTooDeep,
                NextPath + ".recipe",
                (recipe.Nesting + 1).ToString(CultureInfo.InvariantCulture),
                ("limit", Recipe.MostNesting.ToString(CultureInfo.InvariantCulture)));
            recipe = null;
        }

        if (recipe is not null && Checked(taken) is { } sound)
        {
            AddPart(new RecipePart(recipe, sound, id));
        }

        _positions++;
    }

    /// <summary>Counts a part that was refused before it could be added.</summary>
    public void SkipPart() => _positions++;

    public Attempt<Recipe> Build(SubstanceTable table)
    {
        if (_positions == 0)
        {
            Faults.Add(FaultKinds.EmptyRecipe, _root + ".parts", "");
        }
        else if (_positions > Recipe.MostParts)
        {
            Faults.Add(
                FaultKinds.TooManyParts,
                _root + ".parts",
                _positions.ToString(CultureInfo.InvariantCulture),
                ("limit", Recipe.MostParts.ToString(CultureInfo.InvariantCulture)));
            return Faults.Attempt<Recipe>(null);
        }

        CheckIds();
        var resolver = new SubstanceResolver(table, Faults);
        var stocks = _stocks.Select(stock => resolver.Resolve(stock, _root + ".stocks" + PathStep.Of(stock.Name!))).ToArray();
        var parts = _parts.Select((part, index) => resolver.Resolve(part, PathOf(_root, _positionOf[index]))).ToArray();
        if (HasFaults)
        {
            // The parts that stand tell their own faults too, so that all are told at once.
            var sound = Enumerable.Range(0, parts.Length).Where(index => IsResolved(parts[index], table)).ToArray();
            var soundParts = Array.AsReadOnly(sound.Select(index => parts[index]).ToArray());
            Faults.AddRange(new Preparation(Product(stocks, soundParts), table, _root, index => PathOf(_root, _positionOf[sound[index]])).FaultsOfParts());
            return Faults.Attempt<Recipe>(null);
        }

        var recipe = Product(stocks, Array.AsReadOnly(parts));
        Faults.AddRange(Mixture.TryPrepare(recipe, table, _root).Faults);
        return HasFaults ? Faults.Attempt<Recipe>(null) : new Attempt<Recipe>(recipe);
    }

    private bool HasFaults => Faults.Count > _faultsBefore;

    private static bool IsResolved(Part part, SubstanceTable table) => part switch
    {
        SolutionPart solution => table.ById(solution.Stock.Substance) is not null,
        SubstancePart pure => table.ById(pure.Substance) is not null,
        _ => true,
    };

    private Recipe Product(Stock[] stocks, IReadOnlyList<Part> parts) =>
        new(Id, Name, _temperature, _preparedAt, Array.AsReadOnly(stocks), parts, _makeUpTo, Notes);

    private void AddPart(Part part)
    {
        _parts.Add(part);
        _positionOf.Add(_positions);
    }

    private Measure? Checked(Measure? taken) =>
        taken is null ? null : MeasureReader.Check(taken, NextPath + "." + TakenProperty(taken.Dimension), taken.ToString(), Faults);

    internal static string TakenProperty(Dimension dimension) => dimension switch
    {
        Dimension.Mass => "mass",
        Dimension.Amount => "amount",
        Dimension.MassFraction => "recipe",
        _ => "volume",
    };

    private void CheckPurity(Measure? purity)
    {
        if (purity is not null && !(purity.Computed > 0 && purity.Computed <= 1.1))
        {
            Faults.Add(FaultKinds.OutOfRange, NextPath + ".purity", purity.ToString(), ("expected", "purity"), ("low", "0 %"), ("high", "110 %"));
        }
    }

    private Measure? Between0And100(Measure? temperature, string path)
    {
        if (temperature is null || double.IsNaN(temperature.Computed)
            || (temperature.Computed >= ZeroCelsiusK && temperature.Computed <= HundredCelsiusK))
        {
            return temperature is null ? null : MeasureReader.Check(temperature, path, temperature.ToString(), Faults);
        }

        Faults.Add(
            FaultKinds.OutOfRange, path, temperature.ToString(), MeasureReader.Expected(Dimension.Temperature), ("low", "0 Cel"), ("high", "100 Cel"));
        return null;
    }

    private void CheckIds()
    {
        CheckId(Id, _root + ".id");
        var taken = new HashSet<string>(StringComparer.Ordinal);
        for (var i = 0; i < _parts.Count; i++)
        {
            var path = PathOf(_root, _positionOf[i]) + ".id";
            CheckId(_parts[i].Id, path);
            if (_parts[i].Id is { Length: > 0 } id && !taken.Add(id))
            {
                Faults.Add(FaultKinds.DuplicateName, path, id);
            }
        }
    }

    private void CheckId(string? id, string path)
    {
        if (id?.Length == 0)
        {
            Faults.Add(FaultKinds.Incomplete, path, id, ("missing", "an id of one or more characters"));
        }
    }
}

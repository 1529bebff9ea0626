using System;
using System.Collections.Generic;
using System.Linq;
using ArchUnitNET.Domain;
using ArchUnitNET.Domain.Extensions;
using ArchUnitNET.Fluent.Slices;
using ArchUnitNET.Loader;
using ArchUnitNET.xUnit;
using Xunit;

namespace Lyonium.Tests.Architecture;

/// <summary>A room uses only the rooms that it stands on, and what those stand on (DEVELOPERS.md, decisions/0001).</summary>
public sealed class RoomsTests
{
    private const string Root = "Lyonium.";

    private static readonly ArchUnitNET.Domain.Architecture House = new ArchLoader().LoadAssemblies(typeof(Lyonium.Faults.Fault).Assembly).Build();

    private static readonly Dictionary<string, string[]> StandsOn = new(StringComparer.Ordinal)
    {
        ["Faults"] = [],
        ["Quantities"] = ["Faults"],
        ["Documents"] = ["Faults", "Quantities"],
        ["Provenance"] = ["Quantities"],
        ["Water"] = ["Provenance"],
        ["Equilibria"] = [],
        ["Activity"] = ["Equilibria", "Water"],
        ["Solvers"] = ["Equilibria"],
        ["Substances"] = ["Quantities", "Provenance", "Documents"],
        ["Recipes"] = ["Quantities", "Substances", "Water"],
        ["Modelling"] = ["Recipes", "Substances", "Provenance", "Water", "Equilibria", "Activity"],
        ["Predictions"] = ["Modelling", "Solvers", "Documents"],
        ["Records"] = ["Predictions", "Documents"],
        ["Qualification"] = ["Records", "Predictions"],
        ["Conformance"] = ["Activity", "Solvers"],
    };

    [Fact]
    public void Rooms_areThoseOfTheDesign()
    {
        var rooms = House.Types.Where(IsOurs).Select(RoomOf).Distinct(StringComparer.Ordinal).Order(StringComparer.Ordinal);

        Assert.Equal(StandsOn.Keys.Order(StringComparer.Ordinal), rooms);
    }

    [Fact]
    public void Room_usesOnlyWhatItStandsOn()
    {
        var seen = new HashSet<(string, string)>();
        var violations = new SortedSet<string>(StringComparer.Ordinal);
        foreach (var type in House.Types.Where(IsOurs))
        {
            var allowed = Below(RoomOf(type));
            seen.UnionWith(type.GetTypeDependencies().Where(IsOurs).Select(target => (RoomOf(type), RoomOf(target))));
            foreach (var target in type.GetTypeDependencies().Where(IsOurs).Where(target => RoomOf(target) != RoomOf(type) && !allowed.Contains(RoomOf(target))))
            {
                violations.Add($"{type.FullName} uses {target.FullName}");
            }
        }

        // What is known to be used is seen, or the rule would hold of anything.
        Assert.Superset(new HashSet<(string, string)> { ("Records", "Predictions"), ("Modelling", "Equilibria"), ("Recipes", "Substances"), ("Solvers", "Equilibria") }, seen);
        Assert.True(violations.Count == 0, string.Join(Environment.NewLine, violations));
    }

    [Fact]
    public void Rooms_haveNoCycles() =>
        SliceRuleDefinition.Slices().Matching("Lyonium.(*)").Should().BeFreeOfCycles().Check(House);

    [Fact]
    public void TheDesign_itself_hasNoCycles() => Assert.All(StandsOn.Keys, room => Assert.DoesNotContain(room, Below(room)));

    [Fact]
    public void NumericSide_knowsNoChemistryNoUnitsAndNoJson()
    {
        foreach (var type in House.Types.Where(IsOurs).Where(type => RoomOf(type) is "Equilibria" or "Solvers"))
        {
            Assert.DoesNotContain(
                type.GetTypeDependencies(),
                target => target.FullName.StartsWith("UnitsNet", StringComparison.Ordinal) || target.FullName.StartsWith("System.Text.Json", StringComparison.Ordinal));
        }
    }

    [Fact]
    public void OnlyTheDoor_touchesUnitConversions()
    {
        // Elsewhere UnitsNet types pass through, as parameters and computed properties.
        var converters = House.Types.Where(IsOurs)
            .Where(type => type.GetTypeDependencies().Any(target => target.FullName.StartsWith("UnitsNet.Units.", StringComparison.Ordinal)))
            .Select(type => type.FullName)
            .Where(name => !name.Contains('<', StringComparison.Ordinal));

        Assert.Equal(["Lyonium.Quantities.UnitsNetDoor"], converters);
    }

    private static bool IsOurs(IType type) =>
        type.FullName.StartsWith(Root, StringComparison.Ordinal) && type.Namespace.FullName.StartsWith(Root, StringComparison.Ordinal);

    private static string RoomOf(IType type) => type.Namespace.FullName[Root.Length..].Split('.')[0];

    private static HashSet<string> Below(string room)
    {
        var below = new HashSet<string>(StringComparer.Ordinal);
        var left = new Stack<string>(StandsOn[room]);
        while (left.TryPop(out var next))
        {
            if (below.Add(next))
            {
                foreach (var one in StandsOn[next])
                {
                    left.Push(one);
                }
            }
        }

        return below;
    }
}

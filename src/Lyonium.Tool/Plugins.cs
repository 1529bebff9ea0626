using System.Collections.Generic;
using System.CommandLine;
using System.Linq;
using Lyonium.Activity;
using Lyonium.Equilibria;
using Lyonium.Solvers;

namespace Lyonium.Tool;

/// <summary>The methods and activity models that the tool offers, by the names that records pin.</summary>
internal static class Plugins
{
    private static readonly IReadOnlyList<ISolver> Methods = [new ExactSolver()];

    private static readonly IReadOnlyList<IActivityModel> Models = [new DaviesModel(), new IdealModel()];

    public static Option<string> MethodOption()
    {
        var option = new Option<string>("--method") { Description = "the method", DefaultValueFactory = _ => Methods[0].Name };
        option.AcceptOnlyFromAmong([.. Methods.Select(one => one.Name)]);
        return option;
    }

    public static Option<string> ActivityOption()
    {
        var option = new Option<string>("--activity") { Description = "the model of activity coefficients", DefaultValueFactory = _ => Models[0].Name };
        option.AcceptOnlyFromAmong([.. Models.Select(one => one.Name)]);
        return option;
    }

    public static ISolver Method(string name) => Methods.First(one => one.Name == name);

    public static IActivityModel Activity(string name) => Models.First(one => one.Name == name);
}

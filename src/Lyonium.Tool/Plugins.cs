using System.CommandLine;
using System.Linq;
using Lyonium.Activity;
using Lyonium.Solvers;

namespace Lyonium.Tool;

/// <summary>The methods and activity models that the tool offers: those of the library.</summary>
internal static class Plugins
{
    public static Option<string> MethodOption()
    {
        var option = new Option<string>("--method") { Description = "the method", DefaultValueFactory = _ => Methods.All[0].Name };
        option.AcceptOnlyFromAmong([.. Methods.All.Select(one => one.Name)]);
        return option;
    }

    public static Option<string> ActivityOption()
    {
        var option = new Option<string>("--activity")
        {
            Description = "the model of activity coefficients",
            DefaultValueFactory = _ => ActivityModels.Default.Name,
        };
        option.AcceptOnlyFromAmong([.. ActivityModels.All.Select(one => one.Name)]);
        return option;
    }
}

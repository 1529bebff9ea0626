using System;
using Lyonium.Activity;
using Lyonium.Equilibria;
using Lyonium.Solvers;

namespace Lyonium.Predictions;

/// <summary>The names of methods and activity models, which other people's code may not give, or take from the library.</summary>
internal static class PluginName
{
    /// <summary>The name of a method; that of its type where it has none.</summary>
    public static string Of(ISolver method) => Read(() => method.Name) ?? method.GetType().Name;

    /// <summary>The name of an activity model; that of its type where it has none.</summary>
    public static string Of(IActivityModel model) => Read(() => model.Name) ?? model.GetType().Name;

    /// <summary>Refuses a host's own method under the name of one of the library: records would pin the wrong one.</summary>
    /// <exception cref="ArgumentException">It has the name of a method of the library.</exception>
    public static ISolver Checked(ISolver method, string parameter)
    {
        Refuse(Methods.Find(Of(method)), method, "method", Of(method), parameter);
        return method;
    }

    /// <summary>Refuses a host's own activity model under the name of one of the library.</summary>
    /// <exception cref="ArgumentException">It has the name of a model of the library.</exception>
    public static IActivityModel Checked(IActivityModel model, string parameter)
    {
        Refuse(ActivityModels.Find(Of(model)), model, "activity model", Of(model), parameter);
        return model;
    }

    private static void Refuse(object? ofTheLibrary, object plugin, string what, string name, string parameter)
    {
        if (ofTheLibrary is not null && ofTheLibrary.GetType() != plugin.GetType())
        {
            throw new ArgumentException($"'{name}' is the name of the library's own {what}; give this one, {plugin.GetType().Name}, a name of its own.", parameter);
        }
    }

    // What throws here throws again in a prediction, which tells it as a fault.
    private static string? Read(Func<string?> name)
    {
        try
        {
            return name() is { } text && text.Trim().Length > 0 ? text : null;
        }
        catch (Exception e) when (e is not OutOfMemoryException)
        {
            return null;
        }
    }
}

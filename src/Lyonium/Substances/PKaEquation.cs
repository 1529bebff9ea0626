using System;
using Lyonium.Provenance;

namespace Lyonium.Substances;

/// <summary>A published equation for a pKa against temperature: a/T + b + c T + d ln T, T in K.</summary>
/// <remarks>At infinite dilution, molality scale. Immutable; safe to share between threads.</remarks>
public sealed record PKaEquation
{
    /// <summary>a, in K.</summary>
    public double OverT { get; init; }

    /// <summary>b.</summary>
    public double Constant { get; init; }

    /// <summary>c, in 1/K.</summary>
    public double TimesT { get; init; }

    /// <summary>d.</summary>
    public double TimesLnT { get; init; }

    /// <summary>Where it was published.</summary>
    public required Source Source { get; init; }

    /// <summary>How it reached the table.</summary>
    public required Known Known { get; init; }

    /// <summary><see cref="Known"/> in the words of the table: <c>read</c>, <c>memory</c>, <c>read+memory</c> or <c>derived</c>.</summary>
    public string KnownAs => KnownText.Of(Known);

    /// <summary>What else a reader should know; empty where there is nothing.</summary>
    public string Note { get; init; } = "";

    /// <summary>The pKa that the equation gives.</summary>
    /// <param name="temperatureK">The temperature in K, above 0; the step that holds the equation says in which range it was published.</param>
    /// <returns>The pKa.</returns>
    public double At(double temperatureK) =>
        (OverT / temperatureK) + Constant + (TimesT * temperatureK) + (TimesLnT * Math.Log(temperatureK));
}

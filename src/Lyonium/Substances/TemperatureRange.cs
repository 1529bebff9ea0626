namespace Lyonium.Substances;

/// <summary>From which temperature to which a constant may be carried.</summary>
/// <remarks>Immutable; safe to share between threads.</remarks>
/// <param name="LowK">The lowest temperature in K.</param>
/// <param name="HighK">The highest temperature in K.</param>
public sealed record TemperatureRange(double LowK, double HighK)
{
    private const double ZeroCelsiusK = 273.15;

    /// <summary>
    /// Of a step with an enthalpy and a heat capacity, where the table gives no range: 0 to 50 °C. What is left out, a change of the heat
    /// capacity by 3 J/(mol K²), is then at most 0.006 in pKa; what the heat capacity itself may be off by comes on top. Common practice.
    /// </summary>
    internal static TemperatureRange WithHeatCapacity { get; } = OfCelsius(0, 50);

    /// <summary>
    /// Of a step with an enthalpy alone, where the table gives no range: 10 to 40 °C. What is left out, a heat capacity of 200 J/(mol K), is
    /// then at most 0.014 in pKa. Common practice.
    /// </summary>
    internal static TemperatureRange WithEnthalpyAlone { get; } = OfCelsius(10, 40);

    /// <summary>How far a temperature lies outside, in K; 0 where it lies inside.</summary>
    /// <param name="temperatureK">The temperature in K.</param>
    /// <returns>The distance in K, zero or more.</returns>
    public double Beyond(double temperatureK) =>
        temperatureK < LowK ? LowK - temperatureK : temperatureK > HighK ? temperatureK - HighK : 0;

    internal static TemperatureRange OfCelsius(double low, double high) => new(low + ZeroCelsiusK, high + ZeroCelsiusK);
}

using System.Collections.Generic;

namespace Lyonium.Predictions;

/// <summary>Something that can hurt someone who makes the mixture.</summary>
/// <remarks>
/// Not complete, and no replacement for the safety data sheet, local rules and licensed practice. Immutable; safe to share between
/// threads.
/// </remarks>
/// <param name="Code">A stable word for it.</param>
/// <param name="Hazards">GHS hazard statement codes, such as <c>H314</c>.</param>
/// <param name="HazardsEu">Codes that only the European Union has, such as <c>EUH031</c>.</param>
/// <param name="Text">What to do.</param>
/// <param name="Because">The substances that call for it.</param>
public sealed record Caution(
    string Code, IReadOnlyList<string> Hazards, IReadOnlyList<string> HazardsEu, string Text, IReadOnlyList<string> Because);

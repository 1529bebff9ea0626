using System.Collections.Generic;
using Lyonium.Provenance;

namespace Lyonium.Substances;

/// <summary>A protolyte in all its forms, one proton apart; or a spectator, with one form and no steps.</summary>
/// <remarks>Immutable; safe to share between threads.</remarks>
public sealed record Family
{
    /// <summary>The id, for ever.</summary>
    public required string Id { get; init; }

    /// <summary>The name.</summary>
    public required string Name { get; init; }

    /// <summary>The forms, the most protonated first.</summary>
    public required IReadOnlyList<ChemicalFormula> Forms { get; init; }

    /// <summary>
    /// How much of each form as such dissolves, in mol per kg of water, in the order of <see cref="Forms"/>; <see langword="null"/> where
    /// none is listed. Of an acid it leaves out what dissociates; of a gas it is that at 101.325 kPa.
    /// </summary>
    public IReadOnlyList<SourcedValue?> SolubilitiesMolPerKg { get; init; } = [];

    /// <summary>
    /// The ion-size parameter of each form, in ångström, in the order of <see cref="Forms"/>; <see langword="null"/> where none is listed.
    /// </summary>
    public IReadOnlyList<SourcedValue?> IonSizesAngstrom { get; init; } = [];

    /// <summary>The steps between the forms, the most acidic first; one fewer than forms.</summary>
    public required IReadOnlyList<DissociationStep> Steps { get; init; }

    /// <summary>What else a reader should know; empty where there is nothing.</summary>
    public string Note { get; init; } = "";

    /// <summary>The name of the user's table that it comes from; <see langword="null"/> for the library's own.</summary>
    public string? Layer { get; init; }

    /// <summary>The form that has given up every proton the table knows of.</summary>
    public ChemicalFormula Base => Forms[Forms.Count - 1];

    /// <summary>Whether it takes no part in proton exchange.</summary>
    public bool IsSpectator => Steps.Count == 0;
}

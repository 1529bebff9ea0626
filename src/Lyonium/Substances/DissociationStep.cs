using System.Collections.Generic;
using Lyonium.Provenance;

namespace Lyonium.Substances;

/// <summary>One dissociation step of a family: one proton given up.</summary>
/// <remarks>Immutable; safe to share between threads.</remarks>
public sealed record DissociationStep
{
    /// <summary>The id, <c>family:number</c>, such as <c>citrate:1</c>.</summary>
    public required string Id { get; init; }

    /// <summary>The number of the step; 1 is the most acidic.</summary>
    public required int Number { get; init; }

    /// <summary>The chosen pKa.</summary>
    public required SourcedValue PKa { get; init; }

    /// <summary>The standard reaction enthalpy in kJ/mol; <see langword="null"/> where it is not known.</summary>
    public SourcedValue? EnthalpyKJPerMol { get; init; }

    /// <summary>The standard reaction heat capacity in J/(mol K); <see langword="null"/> where it is not known.</summary>
    public SourcedValue? HeatCapacityJPerMolK { get; init; }

    /// <summary>Other published values of the pKa.</summary>
    public IReadOnlyList<SourcedValue> Alternatives { get; init; } = [];

    /// <summary>Why <see cref="PKa"/> was chosen among them; empty where there was no choice.</summary>
    public string Reason { get; init; } = "";
}

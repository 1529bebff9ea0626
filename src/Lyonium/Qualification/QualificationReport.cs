using System.Collections.Generic;
using System.Linq;
using Lyonium.Provenance;

namespace Lyonium.Qualification;

/// <summary>What came of the published checks in one process.</summary>
/// <remarks>
/// Evidence towards installation qualification (which build runs here, with which table) and operational qualification (it gives the
/// published figures here). It does not qualify what a host builds around the library, nor its performance on the host's own samples.
/// Immutable; safe to share between threads.
/// </remarks>
public sealed class QualificationReport
{
    internal QualificationReport(QualificationEnvironment environment, IReadOnlyList<CheckOutcome> outcomes)
    {
        Environment = environment;
        Outcomes = outcomes;
    }

    /// <summary>Where the checks ran.</summary>
    public QualificationEnvironment Environment { get; }

    /// <summary>Every check and what came of it.</summary>
    public IReadOnlyList<CheckOutcome> Outcomes { get; }

    /// <summary>How many checks hold against a figure that was seen in its source.</summary>
    public int Holds => Outcomes.Count(one => one.Verdict == CheckVerdict.Holds && one.Check.Known is (Known.Read or Known.ReadAndMemory));

    /// <summary>How many checks hold against a figure that was computed outside of the library from published equations.</summary>
    public int HoldsAgainstDerived => Outcomes.Count(one => one.Verdict == CheckVerdict.Holds && one.Check.Known == Known.Derived);

    /// <summary>How many agree with a figure that was recalled and not seen in its source.</summary>
    public int AgreesValueNotRead => Outcomes.Count(one => one.AgreesValueNotRead);

    /// <summary>How many fail.</summary>
    public int Fails => Outcomes.Count(one => one.Verdict == CheckVerdict.Fails);

    /// <summary>How many are only reported.</summary>
    public int Reported => Outcomes.Count(one => one.Verdict == CheckVerdict.Reported);

    /// <summary>Whether none fails.</summary>
    public bool IsPassed => Fails == 0;

    /// <summary>The deviations of the pH from published values, by band of ionic strength: the error of the model.</summary>
    public IReadOnlyList<ModelErrorBand> ModelErrors => ModelErrorBand.Of(Outcomes);

    /// <summary>The report as text for people.</summary>
    /// <returns>Lines of text: the environment, the checks by set, the sum.</returns>
    public string ToText() => new QualificationText(this).ToString();

    /// <summary>The report as a page without what differs from machine to machine.</summary>
    /// <returns>Markdown.</returns>
    public string ToMarkdown() => new QualificationPage(this).ToString();

    /// <summary>The report as JSON (<c>lyonium-qualification/1</c>).</summary>
    /// <returns>The text, indented.</returns>
    public string ToJson() => QualificationJson.Write(this);
}

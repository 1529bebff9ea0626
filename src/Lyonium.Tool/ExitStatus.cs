using System;
using System.Collections.Generic;
using System.Linq;
using Lyonium.Faults;

namespace Lyonium.Tool;

/// <summary>What the tool returns to its caller.</summary>
internal static class ExitStatus
{
    /// <summary>Done.</summary>
    public const int Done = 0;

    /// <summary>The input was refused.</summary>
    public const int Refused = 1;

    /// <summary>The command line was wrong.</summary>
    public const int WrongCommandLine = 2;

    /// <summary>The method does not apply, did not settle or failed; or a published check of <c>qualify</c> fails.</summary>
    public const int NoAnswer = 3;

    /// <summary>The status for faults: those of methods have codes from LYO0600 on.</summary>
    public static int Of(IReadOnlyList<Fault> faults) =>
        faults.Any(fault => fault.Code.StartsWith("LYO06", StringComparison.Ordinal)) ? NoAnswer : Refused;
}

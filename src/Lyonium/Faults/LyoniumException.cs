using System;
using System.Collections.Generic;
using System.Linq;

namespace Lyonium.Faults;

/// <summary>Thrown when input is refused or a method does not apply; carries every fault that was found.</summary>
public sealed class LyoniumException : Exception
{
    /// <summary>Makes an exception from the faults found.</summary>
    /// <param name="faults">The faults, in the order of the input; at least one.</param>
    /// <exception cref="ArgumentException"><paramref name="faults"/> is empty.</exception>
    public LyoniumException(IReadOnlyList<Fault> faults)
        : base(Describe(faults)) => Faults = faults;

    /// <summary>Makes an exception from one fault.</summary>
    /// <param name="fault">The fault.</param>
    public LyoniumException(Fault fault)
        : this([fault])
    {
    }

    /// <summary>What was refused, in the order of the input.</summary>
    public IReadOnlyList<Fault> Faults { get; }

    private static string Describe(IReadOnlyList<Fault> faults)
    {
        if (faults is null || faults.Count == 0)
        {
            throw new ArgumentException("An exception needs at least one fault.", nameof(faults));
        }

        return string.Join(Environment.NewLine, faults.Select(fault => fault.ToString()));
    }
}

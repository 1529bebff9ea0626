using System;
using System.Collections.Generic;

namespace Lyonium.Faults;

/// <summary>What came of trying: a value, or the faults that stood in its way.</summary>
/// <remarks>The exception of a failed attempt is built only when it is asked for. Immutable; safe to share between threads.</remarks>
/// <typeparam name="T">The type of the value.</typeparam>
public sealed class Attempt<T>
    where T : class
{
    private readonly T? _value;

    /// <summary>An attempt that succeeded.</summary>
    /// <param name="value">The value.</param>
    public Attempt(T value)
    {
        _value = value ?? throw new ArgumentNullException(nameof(value));
        Faults = [];
    }

    /// <summary>An attempt that failed.</summary>
    /// <param name="faults">The faults; at least one.</param>
    public Attempt(IReadOnlyList<Fault> faults)
    {
        _ = faults ?? throw new ArgumentNullException(nameof(faults));
        Faults = faults.Count > 0 ? faults : throw new ArgumentException("A failed attempt needs at least one fault.", nameof(faults));
    }

    /// <summary>Whether there is a value.</summary>
    public bool Success => _value is not null;

    /// <summary>The value.</summary>
    /// <exception cref="InvalidOperationException">The attempt failed; look at <see cref="Faults"/>.</exception>
    public T Value => _value ?? throw new InvalidOperationException("The attempt failed; its faults say why.");

    /// <summary>The faults, in the order of the input; empty on success.</summary>
    public IReadOnlyList<Fault> Faults { get; }

    /// <summary>The value, or the exception that lists every fault.</summary>
    /// <returns>The value.</returns>
    /// <exception cref="LyoniumException">The attempt failed.</exception>
    public T GetValueOrThrow() => _value ?? throw new LyoniumException(Faults);
}

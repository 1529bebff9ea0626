using System.Collections.Generic;

namespace Lyonium.Faults;

/// <summary>Gathers faults while input is read, so that all of them are told at once.</summary>
internal sealed class FaultList
{
    // A million wrong parts are told as the first hundred; nobody reads more, and memory stays bounded.
    private const int Most = 100;

    private readonly List<Fault> _faults = [];

    public bool Any => _faults.Count > 0;

    public int Count => _faults.Count;

    /// <summary>Whether no further fault is kept, so that none need be worded at length.</summary>
    public bool IsFull => _faults.Count >= Most;

    public void Add(FaultKind kind, string path, string found, params (string Name, string Value)[] arguments) =>
        Add(Fault.Of(kind, path, found, arguments));

    public void Add(Fault fault)
    {
        if (!IsFull)
        {
            _faults.Add(fault);
        }
    }

    public void AddRange(IEnumerable<Fault> faults)
    {
        foreach (var fault in faults)
        {
            Add(fault);
        }
    }

    public IReadOnlyList<Fault> ToList() => _faults.ToArray();

    public Attempt<T> Attempt<T>(T? value)
        where T : class =>
        Any || value is null ? new Attempt<T>(ToList()) : new Attempt<T>(value);

    public void ThrowIfAny()
    {
        if (Any)
        {
            throw new LyoniumException(ToList());
        }
    }
}

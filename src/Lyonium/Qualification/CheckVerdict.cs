namespace Lyonium.Qualification;

/// <summary>What came of a check.</summary>
public enum CheckVerdict
{
    /// <summary>The deviation is within the tolerance.</summary>
    Holds,

    /// <summary>The deviation is beyond the tolerance, or nothing was obtained.</summary>
    Fails,

    /// <summary>The deviation is shown and not judged: the check has no tolerance.</summary>
    Reported,
}

using System;
using Lyonium.Faults;
using Xunit;

namespace Lyonium.Tests.Faults;

public sealed class AttemptTests
{
    private static readonly Fault One = Fault.Of(FaultKinds.EmptyRecipe, "$.parts", "");
    private static readonly Fault Two = Fault.Of(FaultKinds.DuplicateProperty, "$.name", "name");

    [Fact]
    public void Attempt_withValue_succeeds()
    {
        var attempt = new Attempt<string>("water");

        Assert.True(attempt.Success);
        Assert.Equal("water", attempt.Value);
        Assert.Equal("water", attempt.GetValueOrThrow());
        Assert.Empty(attempt.Faults);
    }

    [Fact]
    public void Attempt_withFaults_fails()
    {
        var attempt = new Attempt<string>([One, Two]);

        Assert.False(attempt.Success);
        Assert.Equal([One, Two], attempt.Faults);
        Assert.Throws<InvalidOperationException>(() => attempt.Value);
    }

    [Fact]
    public void GetValueOrThrow_whenFailed_throwsEveryFaultInOrder()
    {
        var thrown = Assert.Throws<LyoniumException>(() => new Attempt<string>([One, Two]).GetValueOrThrow());

        Assert.Equal([One, Two], thrown.Faults);
        Assert.Equal(One + Environment.NewLine + Two, thrown.Message);
    }

    [Fact]
    public void Attempt_withNothing_throws()
    {
        Assert.Throws<ArgumentNullException>(() => new Attempt<string>((string)null!));
        Assert.Throws<ArgumentNullException>(() => new Attempt<string>((Fault[])null!));
        Assert.Throws<ArgumentException>(() => new Attempt<string>(Array.Empty<Fault>()));
    }

    [Fact]
    public void LyoniumException_withoutFaults_throws()
    {
        Assert.Throws<ArgumentException>(() => new LyoniumException([]));
    }

    [Fact]
    public void LyoniumException_ofOneFault_saysIt()
    {
        var exception = new LyoniumException(One);

        Assert.Equal([One], exception.Faults);
        Assert.Equal(One.ToString(), exception.Message);
    }
}

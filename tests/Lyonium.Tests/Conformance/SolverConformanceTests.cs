using System;
using System.Linq;
using Lyonium.Conformance;
using Lyonium.Equilibria;
using Lyonium.Solvers;
using Xunit;

namespace Lyonium.Tests.Conformance;

public sealed class SolverConformanceTests
{
    public static TheoryData<string> MethodNames => [.. Methods.All.Select(one => one.Name)];

    [Theory]
    [MemberData(nameof(MethodNames))]
    public void Check_method_of_the_library_passes(string name)
    {
        var failed = SolverConformance.Check(Methods.Find(name)!).Where(one => !one.Passed).Select(one => one.ToString());
        Assert.Equal([], failed);
    }

    [Theory]
    [InlineData("throws")]
    [InlineData("not a number")]
    [InlineData("seven")]
    [InlineData("outside its bracket")]
    [InlineData("refuses without a reason")]
    [InlineData("solves what it cannot")]
    public void Check_bad_method_fails(string kind) => Assert.Contains(SolverConformance.Check(new BadSolver(kind)), one => !one.Passed);

    private sealed class BadSolver(string kind) : ISolver
    {
        public string Name => "bad";

        public SolverOutcome Solve(Equilibrium equilibrium, IActivityModel model) => kind switch
        {
            "throws" => throw new InvalidOperationException("no"),
            "not a number" => SolverOutcome.Answer(double.NaN),
            "outside its bracket" => new ExactSolver().Solve(equilibrium, model) with { BracketLow = 20, BracketHigh = 21 },
            "refuses without a reason" => SolverOutcome.Without(SolverStatus.DoesNotApply, " "),
            "solves what it cannot" when !equilibrium.IsLadders => SolverOutcome.Answer(5),
            "solves what it cannot" => new ExactSolver().Solve(equilibrium, model),
            _ => SolverOutcome.Answer(7),
        };
    }
}

using System;
using System.Reflection;
using System.Runtime.InteropServices;

namespace Lyonium.Predictions;

/// <summary>Which build of the library computed a number, and on what kind of processor.</summary>
/// <param name="Version">The version of the library.</param>
/// <param name="Target">The target framework that it was built for.</param>
/// <param name="ProcessArchitecture">The architecture of the process, such as <c>X64</c>.</param>
public sealed record SoftwareIdentity(string Version, string Target, string ProcessArchitecture)
{
    /// <summary>The build that is running.</summary>
    public static SoftwareIdentity Running { get; } = new(ReadVersion(), TargetFramework, RuntimeInformation.ProcessArchitecture.ToString());

#if NETSTANDARD2_0
    private const string TargetFramework = "netstandard2.0";
#else
    private const string TargetFramework = "net10.0";
#endif

    private static string ReadVersion()
    {
        var version = typeof(SoftwareIdentity).Assembly.GetCustomAttribute<AssemblyInformationalVersionAttribute>()?.InformationalVersion ?? "0";
        var build = version.IndexOf("+", StringComparison.Ordinal);
        return build < 0 ? version : version.Substring(0, build);
    }
}

using System;
using System.Collections;
using System.Collections.Generic;
using System.IO;
using System.Linq;
using System.Reflection;
using System.Runtime.CompilerServices;
using Xunit;

namespace Lyonium.Tests.Architecture;

/// <summary>What hosts see: sealed, immutable, one type a file, no file too long.</summary>
public sealed class PublicTypesTests
{
    private static readonly Type[] Public = typeof(Lyonium.Faults.Fault).Assembly.GetExportedTypes();

    // Makes a recipe line by line, and says so.
    private static readonly Type[] Mutable = [typeof(Lyonium.Recipes.RecipeBuilder)];

    [Fact]
    public void PublicClasses_areSealedOrAbstractOrStatic() =>
        Assert.Empty(Public.Where(type => type.IsClass && !type.IsSealed && !type.IsAbstract).Select(type => type.FullName));

    [Fact]
    public void PublicAbstractClasses_canOnlyBeDerivedHere() =>
        Assert.Empty(Public
            .Where(type => type is { IsClass: true, IsAbstract: true, IsSealed: false })
            .Where(type => type.GetConstructors(BindingFlags.Instance | BindingFlags.Public | BindingFlags.NonPublic).Any(one => one.IsPublic || one.IsFamily || one.IsFamilyOrAssembly))
            .Select(type => type.FullName));

    [Fact]
    public void PublicStructs_areReadonly() =>
        Assert.Empty(Public.Where(type => type.IsValueType && !type.IsEnum && type.GetCustomAttribute<IsReadOnlyAttribute>() is null).Select(type => type.FullName));

    [Fact]
    public void PublicProperties_haveNoSettersButInit() =>
        Assert.Empty(Public
            .SelectMany(type => type.GetProperties(BindingFlags.Public | BindingFlags.NonPublic | BindingFlags.Instance | BindingFlags.Static | BindingFlags.DeclaredOnly))
            .Where(property => property.SetMethod is { IsPrivate: false } setter && !IsInit(setter))
            .Select(property => property.DeclaringType!.FullName + "." + property.Name));

    [Fact]
    public void Fields_areReadonly() =>
        Assert.Empty(Public.Except(Mutable)
            .Where(type => !type.IsEnum)
            .SelectMany(type => type.GetFields(BindingFlags.Public | BindingFlags.NonPublic | BindingFlags.Instance | BindingFlags.Static | BindingFlags.DeclaredOnly))
            .Where(field => !field.IsInitOnly && !field.IsLiteral && !IsInitBacking(field))
            .Select(field => field.DeclaringType!.FullName + "." + field.Name));

    [Fact]
    public void PublicMembers_showNoMutableCollections() =>
        Assert.Empty(Public
            .SelectMany(type => type.GetProperties(BindingFlags.Public | BindingFlags.Instance | BindingFlags.Static | BindingFlags.DeclaredOnly))
            .Where(property => IsMutable(property.PropertyType))
            .Select(property => property.DeclaringType!.FullName + "." + property.Name));

    [Fact]
    public void PublicMethods_returnNoMutableCollections() =>
        Assert.Empty(Public
            .SelectMany(type => type.GetMethods(BindingFlags.Public | BindingFlags.Instance | BindingFlags.Static | BindingFlags.DeclaredOnly))
            .Where(method => IsMutable(method.ReturnType))
            .Select(method => method.DeclaringType!.FullName + "." + method.Name));

    [Fact]
    public void PublicTypes_haveNoBannedNames() =>
        Assert.Empty(Public.Where(type => new[] { "Helper", "Util", "Manager", "Common" }.Any(word => type.Name.Contains(word, StringComparison.Ordinal))).Select(type => type.FullName));

    [Fact]
    public void PublicEquatables_overrideEqualsAndHash() =>
        Assert.Empty(Public
            .Where(type => type is { IsInterface: false } && typeof(IEquatable<>).MakeGenericType(type.IsGenericTypeDefinition ? typeof(object) : type).IsAssignableFrom(type))
            .Where(type => type.GetMethod(nameof(Equals), [typeof(object)])!.DeclaringType == typeof(object) || type.GetMethod(nameof(GetHashCode), [])!.DeclaringType == typeof(object))
            .Select(type => type.FullName));

    [Fact]
    public void SourceFiles_areShorterThan400Lines() =>
        Assert.Empty(new[] { "src", "tests", "benchmarks" }
            .SelectMany(folder => Directory.EnumerateFiles(Path.Combine(Repository.Root, folder), "*.cs", SearchOption.AllDirectories))
            .Where(file => !file.Contains(Path.DirectorySeparatorChar + "obj" + Path.DirectorySeparatorChar, StringComparison.Ordinal))
            .Where(file => File.ReadLines(file).Count() > 400)
            .Select(file => Path.GetRelativePath(Repository.Root, file)));

    [Fact]
    public void SourceFolders_areNamespaces()
    {
        var root = Path.Combine(Repository.Root, "src", "Lyonium");
        foreach (var file in Directory.EnumerateFiles(root, "*.cs", SearchOption.AllDirectories))
        {
            var folder = Path.GetRelativePath(root, Path.GetDirectoryName(file)!);
            if (folder.StartsWith("obj", StringComparison.Ordinal) || folder.StartsWith("bin", StringComparison.Ordinal) || folder == "Polyfills")
            {
                continue;
            }

            Assert.Contains($"namespace Lyonium.{folder};", File.ReadAllText(file), StringComparison.Ordinal);
        }
    }

    private static bool IsInit(MethodInfo setter) =>
        setter.ReturnParameter.GetRequiredCustomModifiers().Contains(typeof(IsExternalInit));

    // The compiler's field behind an init property is not marked readonly in a struct's field keyword form.
    private static bool IsInitBacking(FieldInfo field) =>
        field.Name.StartsWith('<')
        && field.DeclaringType!.GetProperty(field.Name[1..field.Name.IndexOf('>', StringComparison.Ordinal)], BindingFlags.Public | BindingFlags.NonPublic | BindingFlags.Instance | BindingFlags.Static)
            is { } property
        && (property.SetMethod is null || IsInit(property.SetMethod) || property.SetMethod.IsPrivate);

    private static bool IsMutable(Type type)
    {
        if (type.IsArray)
        {
            return true;
        }

        var shape = type.IsGenericType ? type.GetGenericTypeDefinition() : type;
        Type[] mutable =
        [
            typeof(List<>), typeof(IList<>), typeof(ICollection<>), typeof(Dictionary<,>), typeof(IDictionary<,>), typeof(HashSet<>), typeof(ISet<>),
            typeof(SortedDictionary<,>), typeof(Queue<>), typeof(Stack<>), typeof(IList), typeof(IDictionary), typeof(ICollection), typeof(Span<>), typeof(Memory<>),
        ];
        return mutable.Contains(shape);
    }
}

using System.Collections.Generic;

namespace Lyonium.Faults;

/// <summary>Every kind of fault, by name. <c>docs/faults.md</c> is generated from this list.</summary>
/// <remarks>01 quantities, 02 JSON text, 03 substances and their table, 04 recipes, 05 modelling, 06 methods, 07 files.</remarks>
public static class FaultKinds
{
    /// <summary>A quantity of another dimension than the place wants.</summary>
    public static FaultKind WrongDimension { get; } = new(
        "LYO0101", "wrong dimension", "A quantity of the kind '{expected}' is wanted here, and '{found}' is of the kind '{actual}'.", "give a quantity of the kind '{expected}', such as {example}");

    /// <summary>Text that is not a number and a unit.</summary>
    public static FaultKind NotAQuantity { get; } = new(
        "LYO0102", "not a quantity", "'{found}' is not a number, a blank and a unit.", "give a quantity of the kind '{expected}', such as {example}");

    /// <summary>A number with a decimal comma or digit groups.</summary>
    public static FaultKind DecimalComma { get; } = new(
        "LYO0103", "comma in a number", "'{found}' has a comma in its number.", "use a point as the decimal sign and no digit groups, such as {example}");

    /// <summary>A unit that is not read here.</summary>
    public static FaultKind UnknownUnit { get; } = new(
        "LYO0104", "unknown unit", "'{unit}' is not a unit that is read here.", "use one of {known}");

    /// <summary>A negative quantity.</summary>
    public static FaultKind Negative { get; } = new(
        "LYO0105", "negative", "'{found}' is negative.", "give a quantity of the kind '{expected}' of zero or more");

    /// <summary>Zero where it makes no sense.</summary>
    public static FaultKind Zero { get; } = new(
        "LYO0106", "zero", "'{found}' is zero, which has no meaning here.", "give a quantity of the kind '{expected}' above zero");

    /// <summary>NaN, infinity, or a number beyond what a double holds.</summary>
    public static FaultKind NotFinite { get; } = new(
        "LYO0107", "not a finite number", "'{found}' is not a finite number.", "give a finite number, such as {example}");

    /// <summary>A quantity outside the range that is allowed at the place.</summary>
    public static FaultKind OutOfRange { get; } = new(
        "LYO0108", "out of range", "'{found}' lies outside {low} to {high}.", "give a quantity of the kind '{expected}' from {low} to {high}");

    /// <summary>Text that is not JSON.</summary>
    public static FaultKind NotJson { get; } = new(
        "LYO0201", "not JSON", "The text is not JSON: {detail}", "correct the JSON at line {line}, position {position}");

    /// <summary>More text than is read.</summary>
    public static FaultKind TooLarge { get; } = new(
        "LYO0202", "too large", "The text is larger than {limit}.", "split it into documents of at most {limit} each");

    /// <summary>A document of another format.</summary>
    public static FaultKind WrongFormat { get; } = new(
        "LYO0203", "wrong format", "The document's format is '{found}', and {expected} is read here.", "set \"format\" to \"{latest}\"");

    /// <summary>A document of a later version of the format.</summary>
    public static FaultKind FormatTooNew { get; } = new(
        "LYO0204", "format too new", "The document's format is '{found}', which is newer than this library's {expected}.", "use a later version of the library, or set \"format\" to \"{latest}\" and leave out what it does not have");

    /// <summary>A property that the format does not know.</summary>
    public static FaultKind UnknownProperty { get; } = new(
        "LYO0205", "unknown property", "'{found}' is not a property of this object.", "{suggestion}");

    /// <summary>A property that stands twice.</summary>
    public static FaultKind DuplicateProperty { get; } = new(
        "LYO0206", "duplicate property", "The property '{found}' stands twice in one object.", "keep one of them");

    /// <summary>A property that must be there and is not.</summary>
    public static FaultKind MissingProperty { get; } = new(
        "LYO0207", "missing property", "The property '{property}' is missing.", "add \"{property}\"");

    /// <summary>A JSON value of another type than the place wants.</summary>
    public static FaultKind WrongType { get; } = new(
        "LYO0208", "wrong type", "Here {expected} is wanted, and {actual} was found.", "give {expected}");

    /// <summary>A name that must be one of a few.</summary>
    public static FaultKind NotAmongThese { get; } = new(
        "LYO0209", "not among these", "'{found}' is not known here.", "use one of {known}");

    /// <summary>A substance that the table does not have.</summary>
    public static FaultKind UnknownSubstance { get; } = new(
        "LYO0301", "unknown substance", "'{found}' is not in the table.", "{suggestion}");

    /// <summary>A name or formula that fits more than one substance.</summary>
    public static FaultKind AmbiguousSubstance { get; } = new(
        "LYO0302", "ambiguous substance", "'{found}' fits more than one substance.", "name one of {candidates}");

    /// <summary>A pKa that is not above the one before it.</summary>
    public static FaultKind TableStepOutOfOrder { get; } = new(
        "LYO0311", "step out of order", "Step {step} of '{family}' has pKa {found}, not above {before} of the step before it.", "list the steps from the most acidic on, each pKa above the last");

    /// <summary>An id or a name that stands twice in a table.</summary>
    public static FaultKind TableDuplicate { get; } = new(
        "LYO0312", "duplicate in the table", "'{found}' already names {owner}.", "give each family, substance, name and source a text of its own");

    /// <summary>A value whose source is not listed.</summary>
    public static FaultKind TableMissingSource { get; } = new(
        "LYO0313", "missing source", "The source '{found}' is not listed under \"sources\".", "list the source with its citation; a value without a source is not taken");

    /// <summary>A formula that cannot be read.</summary>
    public static FaultKind TableBadFormula { get; } = new(
        "LYO0314", "bad formula", "'{found}' is not a formula: {detail}.", "write elements, counts, parentheses and a charge, such as H2PO4^-, or crystal water, such as Na2CO3.10H2O");

    /// <summary>Two neighbouring forms that are not one proton apart.</summary>
    public static FaultKind TableBadLadder { get; } = new(
        "LYO0315", "forms not one proton apart", "The form '{found}' of '{family}' is not the one before it less one H and one positive charge.", "list the forms from the most protonated on, one proton apart, with one step fewer than forms");

    /// <summary>A substance whose formula is not what it brings.</summary>
    public static FaultKind TableNotBalanced { get; } = new(
        "LYO0316", "formula and parts differ", "'{found}' is not the sum of what it brings: {detail}.", "correct the formula, \"brings\" or \"protons\"");

    /// <summary>A substance that brings a family which the table does not have.</summary>
    public static FaultKind TableUnknownFamily { get; } = new(
        "LYO0317", "unknown family", "'{found}' is not a family of the table.", "add the family, or name one that is there");

    /// <summary>A value of a table that cannot be right.</summary>
    public static FaultKind TableBadValue { get; } = new(
        "LYO0318", "bad value in the table", "'{found}' cannot stand here: {detail}.", "correct the value");

    /// <summary>A family of a layer that ends in another base form than the one whose place it takes.</summary>
    public static FaultKind TableChangesBase { get; } = new(
        "LYO0319", "another base form", "The family '{family}' ends in {found}, and the one whose place it takes in {base}.", "end the forms in {base}, or give the family an id of its own");

    /// <summary>A recipe without parts.</summary>
    public static FaultKind EmptyRecipe { get; } = new(
        "LYO0401", "empty recipe", "The recipe has no parts.", "pour, weigh or add at least one part");

    /// <summary>A part, stock or mark that says the same thing in two ways.</summary>
    public static FaultKind Contradictory { get; } = new(
        "LYO0402", "contradictory", "{found} cannot stand together here.", "keep one of them");

    /// <summary>A part or stock that does not say enough.</summary>
    public static FaultKind Incomplete { get; } = new(
        "LYO0403", "incomplete", "Here {missing} is missing.", "give {missing}");

    /// <summary>A part that pours from a stock which the recipe does not list.</summary>
    public static FaultKind UnknownStock { get; } = new(
        "LYO0404", "unknown stock", "'{found}' is not one of the recipe's stocks.", "list it under \"stocks\", or name one of {known}");

    /// <summary>A part id or stock name that stands twice.</summary>
    public static FaultKind DuplicateName { get; } = new(
        "LYO0405", "duplicate name", "'{found}' is taken already.", "give each part id and each stock a name of its own");

    /// <summary>A mark below what is already in the vessel.</summary>
    public static FaultKind MarkBelowContents { get; } = new(
        "LYO0406", "mark below the contents", "The mark is at {found}, and {contents} is in already.", "raise the mark above {contents}, or pour less");

    /// <summary>A solution whose water cannot be told without a density.</summary>
    public static FaultKind NeedsDensity { get; } = new(
        "LYO0407", "density needed", "The water in this solution of {substance} ({found}) cannot be told without a density: {detail}.", "give the \"density\" of the solution, such as 1.18 g/mL");

    /// <summary>A stock that is stronger than a solution can be.</summary>
    public static FaultKind StrongerThanPossible { get; } = new(
        "LYO0408", "stronger than possible", "A solution of {substance} cannot be {found}: {detail}.", "correct the strength or the density");

    /// <summary>A mixture without water.</summary>
    public static FaultKind NoWater { get; } = new(
        "LYO0409", "no water", "The mixture has no water, and the pH of an aqueous solution is asked for.", "add water or a solution in water");

    /// <summary>More parts than a recipe may have.</summary>
    public static FaultKind TooManyParts { get; } = new(
        "LYO0410", "too many parts", "The recipe has {found} parts, and at most {limit} are read.", "split the recipe");

    /// <summary>More of a recipe than it makes.</summary>
    public static FaultKind MoreThanTheRecipeMakes { get; } = new(
        "LYO0411", "more than the recipe makes", "{found} is taken of a recipe that makes {makes}.", "take at most {makes}, or scale the recipe");

    /// <summary>Amounts so large that they overflow.</summary>
    public static FaultKind MixtureOverflows { get; } = new(
        "LYO0412", "amounts overflow", "The amounts add up to {found}, which no vessel holds.", "correct the amounts; at most 1e9 kg and 1e9 mol are taken, and molalities up to 1e6 mol/kg");

    /// <summary>Recipes poured into each other over too many levels.</summary>
    public static FaultKind NestedTooDeep { get; } = new(
        "LYO0413", "nested too deep", "Recipes are poured into each other over {found} levels, and at most {limit} are taken.", "pour the parts of the innermost recipes themselves");

    /// <summary>A recipe with a substance that the predictor's table does not have.</summary>
    public static FaultKind NotInThisTable { get; } = new(
        "LYO0502", "substance not in this table", "The recipe's substance '{found}' is not in edition {edition} of the table.", "predict with the table that the recipe was built with");

    /// <summary>A set of ion pairs that the table does not have.</summary>
    public static FaultKind UnknownPairSet { get; } = new(
        "LYO0503", "unknown set of ion pairs", "The table has no set of ion pairs '{found}'.", "use some of: {known}; or none");

    /// <summary>A set of ion pairs whose constants do not hold with the activity model.</summary>
    public static FaultKind PairSetOfAnotherModel { get; } = new(
        "LYO0504", "set of ion pairs of another model", "The set of ion pairs '{found}' does not belong to the activity model '{model}': what the pairs do is in its coefficients already, or its constants were derived otherwise.", "leave the set out, or use one of the models {models}");

    /// <summary>A species made of more than one component.</summary>
    public static FaultKind CoupledSpecies { get; } = new(
        "LYO0601", "coupled species", "The method '{method}' does not solve {found}: species over more than one component.", "use the method 'exact', or predict without ion pairs");

    /// <summary>A component held at a fixed activity.</summary>
    public static FaultKind FixedActivity { get; } = new(
        "LYO0602", "fixed activity", "The method '{method}' does not solve {found}: a component at a fixed activity.", "give the component a total, or use a method that solves fixed activities");

    /// <summary>A method that does not apply to the mixture.</summary>
    public static FaultKind MethodDoesNotApply { get; } = new(
        "LYO0603", "method does not apply", "The method '{method}' does not apply: {found}.", "use the method 'exact'");

    /// <summary>A method that did not settle on an answer.</summary>
    public static FaultKind DidNotSettle { get; } = new(
        "LYO0604", "did not settle", "The method '{method}' did not settle: {found}.", "{suggestion}");

    /// <summary>A method or an activity model that failed or gave an impossible answer.</summary>
    public static FaultKind MethodFailed { get; } = new(
        "LYO0605", "method failed", "The method '{method}' with the activity model '{model}' failed: {found}.", "tell the author of the method or of the model");

    /// <summary>A file that is not there.</summary>
    public static FaultKind FileNotFound { get; } = new(
        "LYO0701", "file not found", "There is no file '{found}'.", "check the name, or give - to read standard input");

    /// <summary>A folder where a file is wanted.</summary>
    public static FaultKind IsAFolder { get; } = new(
        "LYO0702", "a folder", "'{found}' is a folder, and a file is wanted.", "name a file in it");

    /// <summary>A file that cannot be read.</summary>
    public static FaultKind CannotRead { get; } = new(
        "LYO0703", "cannot be read", "'{found}' cannot be read: {detail}", "check that the file may be read");

    /// <summary>All kinds, by code.</summary>
    public static IReadOnlyList<FaultKind> All { get; } =
    [
        WrongDimension, NotAQuantity, DecimalComma, UnknownUnit, Negative, Zero, NotFinite, OutOfRange,
        NotJson, TooLarge, WrongFormat, FormatTooNew, UnknownProperty, DuplicateProperty, MissingProperty, WrongType, NotAmongThese,
        UnknownSubstance, AmbiguousSubstance,
        TableStepOutOfOrder, TableDuplicate, TableMissingSource, TableBadFormula, TableBadLadder, TableNotBalanced, TableUnknownFamily, TableBadValue, TableChangesBase,
        EmptyRecipe, Contradictory, Incomplete, UnknownStock, DuplicateName, MarkBelowContents, NeedsDensity, StrongerThanPossible, NoWater,
        TooManyParts, MoreThanTheRecipeMakes, MixtureOverflows, NestedTooDeep,
        NotInThisTable, UnknownPairSet, PairSetOfAnotherModel,
        CoupledSpecies, FixedActivity, MethodDoesNotApply, DidNotSettle, MethodFailed,
        FileNotFound, IsAFolder, CannotRead,
    ];
}

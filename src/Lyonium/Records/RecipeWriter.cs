using System.Text.Json;
using Lyonium.Quantities;
using Lyonium.Recipes;

namespace Lyonium.Records;

/// <summary>Writes a recipe as <c>lyonium-recipe/1</c>.</summary>
internal static class RecipeWriter
{
    public static void Write(Utf8JsonWriter writer, Recipe recipe)
    {
        writer.WriteStartObject();
        writer.WriteString("format", RecipeJson.FormatName + "/" + RecipeJson.FormatVersion);
        WriteText(writer, "id", recipe.Id);
        WriteText(writer, "name", recipe.Name);
        WriteMeasure(writer, "temperature", recipe.Temperature);
        WriteMeasure(writer, "preparedAt", recipe.PreparedAt);
        if (recipe.Stocks.Count > 0)
        {
            writer.WriteStartObject("stocks");
            foreach (var stock in recipe.Stocks)
            {
                writer.WriteStartObject(stock.Name!);
                WriteStock(writer, stock);
                writer.WriteEndObject();
            }

            writer.WriteEndObject();
        }

        writer.WriteStartArray("parts");
        foreach (var part in recipe.Parts)
        {
            WritePart(writer, part);
        }

        writer.WriteEndArray();
        WriteMeasure(writer, "makeUpTo", recipe.MakeUpTo);
        if (recipe.Notes is { } notes)
        {
            writer.WritePropertyName("notes");
            writer.WriteRawValue(notes);
        }

        writer.WriteEndObject();
    }

    private static void WritePart(Utf8JsonWriter writer, Part part)
    {
        writer.WriteStartObject();
        WriteText(writer, "id", part.Id);
        switch (part)
        {
            case SolutionPart { Stock.Name: { } name }:
                writer.WriteString("stock", name);
                break;
            case SolutionPart solution:
                WriteStock(writer, solution.Stock);
                break;
            case SubstancePart pure:
                writer.WriteString("substance", pure.Substance);
                break;
            case RecipePart inner:
                writer.WritePropertyName("recipe");
                Write(writer, inner.Recipe);
                break;
            default:
                writer.WriteString("substance", "water");
                break;
        }

        if (part is not RecipePart { IsAll: true })
        {
            WriteMeasure(writer, RecipeDraft.TakenProperty(part.Taken.Dimension), part.Taken);
        }

        WriteMeasure(writer, "purity", (part as SubstancePart)?.Purity);
        writer.WriteEndObject();
    }

    private static void WriteStock(Utf8JsonWriter writer, Stock stock)
    {
        writer.WriteString("substance", stock.Substance);
        WriteMeasure(writer, Stock.StrengthProperty(stock.Strength.Dimension), stock.Strength);
        WriteMeasure(writer, "density", stock.Density);
    }

    private static void WriteText(Utf8JsonWriter writer, string name, string? text)
    {
        if (text is not null)
        {
            writer.WriteString(name, text);
        }
    }

    private static void WriteMeasure(Utf8JsonWriter writer, string name, Measure? measure)
    {
        if (measure is null)
        {
            return;
        }

        if (measure.StandardUncertainty is not double uncertainty)
        {
            writer.WriteString(name, measure.ToString());
            return;
        }

        writer.WriteStartObject(name);
        WriteNumber(writer, "value", measure.Value);
        writer.WriteString("unit", measure.Unit);
        WriteNumber(writer, "standardUncertainty", uncertainty);
        writer.WriteEndObject();
    }

    private static void WriteNumber(Utf8JsonWriter writer, string name, double value)
    {
        writer.WritePropertyName(name);
        writer.WriteRawValue(NumberText.Shortest(value));
    }
}

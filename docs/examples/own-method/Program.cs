using System;
using System.Linq;
using Lyonium.Conformance;
using Lyonium.Predictions;
using Lyonium.Recipes;
using OwnMethod;

var recipe = Recipe.Named("House brine, sharpened")
    .At("25 Cel")
    .Pour("12.5 mL", Stock.Of("hydrochloric acid", "0.0500 mol/L"))
    .Pour("4 mL", Stock.Of("lactic acid", "88 %").WithDensity("1.20 g/mL"))
    .Weigh("2.5 g", "sodium chloride")
    .MakeUpTo("250 mL")
    .Build();

var prediction = new Predictor().With(new HalvingSolver()).Predict(recipe);
Console.WriteLine($"{prediction.Method}: {prediction}");

var failed = SolverConformance.Check(new HalvingSolver()).Where(check => !check.Passed).ToArray();
Console.WriteLine($"{failed.Length} conformance checks failed");
return failed.Length == 0 ? 0 : 1;

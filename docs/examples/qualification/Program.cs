using System;
using System.IO;
using Lyonium.Qualification;

// The defaults; with a predictor of your own (table layers, method, activity model): new Qualifier(predictor).
var report = new Qualifier().Run();

File.WriteAllText("qualification.json", report.ToJson());   // lyonium-qualification/1, see docs/schemas
File.WriteAllText("qualification.txt", report.ToText());
Console.WriteLine($"{report.Outcomes.Count} checks, passed: {report.IsPassed}");

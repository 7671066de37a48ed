using System.CommandLine;
using UnitVent.CohortStudy;
using UnitVent.Simulation.Cohort;

var seed = new Option<ulong>("--seed") { Description = "Chooses the patients, their noise and the times of the staff.", DefaultValueFactory = _ => 4 };
var patients = new Option<int>("--patients") { Description = "How many; every second one slips.", DefaultValueFactory = _ => 210 };
var cases = new Option<bool>("--cases") { Description = "Also lists what each patient's cards were." };
var study = new RootCommand("Simulated patients of three days, half of them with one planted deterioration: what the rules find, and how quiet they are otherwise.")
{
    seed, patients, cases,
};
study.SetAction(parsed =>
{
    var courses = Study.Run(parsed.GetValue(seed), parsed.GetValue(patients));
    IEnumerable<string> lines = StudyReport.Of(courses);
    foreach (var line in parsed.GetValue(cases) ? lines.Concat(CaseList.Of(courses)) : lines)
    {
        Console.WriteLine(line);
    }
});
return study.Parse(args).Invoke();

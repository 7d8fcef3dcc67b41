using Selector.Cli.Assess;
using Selector.Cli.Compute;
using Spectre.Console.Cli;

var app = new CommandApp();
app.Configure(config =>
{
    config.SetApplicationName("selector");
    config.UseStrictParsing();
    config.AddCommand<ComputeCommand>("compute")
        .WithDescription("Solves the bare equations for every row of a table.")
        .WithExample("compute", "rectifier", "cases.csv", "--out", "results.csv");
    config.AddCommand<AssessCommand>("assess")
        .WithDescription("Assesses a supply: every stress at its worst corner, held against the policy.")
        .WithExample("assess", "supply.json", "--json");
});
return await app.RunAsync(args);

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
});
return await app.RunAsync(args);

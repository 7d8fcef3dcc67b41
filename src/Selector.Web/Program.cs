using Selector.Web.Composition;

if (HealthProbe.Asked(args) is { } address)
{
    return await HealthProbe.Run(address);
}

try
{
    var app = Server.Build(args);
    await Server.Prepare(app);
    await app.RunAsync();
    return 0;
}
catch (NotLoopbackException e)
{
    // A plain sentence: whoever starts it must read what to do, not where it was thrown.
    await Console.Error.WriteLineAsync(e.Message);
    return 2;
}

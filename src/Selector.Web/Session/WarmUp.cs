using Selector.Application.Assessing;
using Selector.Application.Supplies;

namespace Selector.Web.Session;

/// <summary>
/// Solves the supplies that were edited last, once the server is up: the first edits of a day are then as quick as the later ones,
/// since the runtime has compiled the solvers by then. Whoever asks for a page meanwhile goes first.
/// </summary>
public sealed class WarmUp(SupplyDesk supplies, AssessmentDesk desk, ILogger<WarmUp> log) : BackgroundService
{
    private const int Supplies = 2;

    /// <summary>The runtime compiles a method with all its means only when it has been called some thirty times.</summary>
    private const int Rounds = 6;

    private static readonly TimeSpan After = TimeSpan.FromSeconds(1.5);

    protected override async Task ExecuteAsync(CancellationToken stoppingToken)
    {
        try
        {
            await Task.Delay(After, stoppingToken);
            foreach (var line in (await supplies.List(stoppingToken)).Take(Supplies))
            {
                for (var round = 0; round < Rounds && await supplies.Open(line.Number, stoppingToken) is { } state; round++)
                {
                    await desk.Assess(state, stoppingToken);
                    await Task.Delay(20, stoppingToken);
                }
            }
        }
        catch (Exception e) when (e is OperationCanceledException or SolverBusyException)
        {
            // The server stops, or it is busy with what this would only have prepared.
            log.LogDebug(e, "Not warmed up.");
        }
    }
}

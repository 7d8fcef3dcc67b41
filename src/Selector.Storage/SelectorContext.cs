using Microsoft.EntityFrameworkCore;
using Selector.Storage.Entities;

namespace Selector.Storage;

/// <summary>
/// The model that every store shares. Each store derives its own context with its own migrations, since their columns differ in
/// type; nothing in here may know which one it is.
/// </summary>
public abstract class SelectorContext(DbContextOptions options) : DbContext(options)
{
    public DbSet<PartRecord> Parts => Set<PartRecord>();

    public DbSet<SupplyRecord> Supplies => Set<SupplyRecord>();

    public DbSet<SupplyText> SupplyTexts => Set<SupplyText>();

    public DbSet<SupplyEdit> SupplyEdits => Set<SupplyEdit>();

    public DbSet<CatalogueVersion> CatalogueVersions => Set<CatalogueVersion>();

    public override int SaveChanges(bool acceptAllChangesOnSuccess)
    {
        CountVersions();
        return base.SaveChanges(acceptAllChangesOnSuccess);
    }

    public override Task<int> SaveChangesAsync(bool acceptAllChangesOnSuccess, CancellationToken cancellationToken = default)
    {
        CountVersions();
        return base.SaveChangesAsync(acceptAllChangesOnSuccess, cancellationToken);
    }

    protected override void OnModelCreating(ModelBuilder modelBuilder) =>
        modelBuilder.ApplyConfigurationsFromAssembly(typeof(SelectorContext).Assembly);

    protected override void ConfigureConventions(ModelConfigurationBuilder configurationBuilder) =>
        configurationBuilder.Properties<DateTime>().HaveConversion<UtcConverter>();

    private void CountVersions()
    {
        foreach (var entry in ChangeTracker.Entries<IVersioned>())
        {
            if (entry.State is EntityState.Added or EntityState.Modified)
            {
                entry.Entity.Version++;
            }
        }
    }
}

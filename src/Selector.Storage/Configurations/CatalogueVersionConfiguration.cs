using Microsoft.EntityFrameworkCore;
using Microsoft.EntityFrameworkCore.Metadata.Builders;
using Selector.Storage.Entities;

namespace Selector.Storage.Configurations;

internal sealed class CatalogueVersionConfiguration : IEntityTypeConfiguration<CatalogueVersion>
{
    public void Configure(EntityTypeBuilder<CatalogueVersion> builder)
    {
        builder.ToTable("catalogue_version");
        builder.HasKey(v => v.Id);
        builder.Property(v => v.Id).ValueGeneratedNever();
        builder.Property(v => v.Version).IsConcurrencyToken();
        builder.HasData(new CatalogueVersion { ChangedUtc = DateTime.UnixEpoch });
    }
}

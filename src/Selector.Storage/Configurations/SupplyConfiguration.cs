using Microsoft.EntityFrameworkCore;
using Microsoft.EntityFrameworkCore.Metadata.Builders;
using Selector.Storage.Entities;

namespace Selector.Storage.Configurations;

internal sealed class SupplyConfiguration : IEntityTypeConfiguration<SupplyRecord>
{
    public void Configure(EntityTypeBuilder<SupplyRecord> builder)
    {
        builder.ToTable("supply");
        builder.HasKey(s => s.Number);
        builder.Property(s => s.Number).ValueGeneratedOnAdd();
        builder.Property(s => s.Name).HasMaxLength(Limits.Name);
        builder.Property(s => s.Version).IsConcurrencyToken();
        builder.HasIndex(s => s.EditedUtc);
    }
}

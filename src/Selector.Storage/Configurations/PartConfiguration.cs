using Microsoft.EntityFrameworkCore;
using Microsoft.EntityFrameworkCore.Metadata.Builders;
using Selector.Storage.Entities;

namespace Selector.Storage.Configurations;

internal sealed class PartConfiguration : IEntityTypeConfiguration<PartRecord>
{
    public void Configure(EntityTypeBuilder<PartRecord> builder)
    {
        builder.ToTable("part");
        builder.HasKey(p => p.Id);
        builder.Property(p => p.Family).HasMaxLength(Limits.Word);
        builder.Property(p => p.Maker).HasMaxLength(Limits.Cell);
        builder.Property(p => p.OrderingCode).HasMaxLength(Limits.Cell);
        builder.Property(p => p.ShopNumber).HasMaxLength(Limits.Cell);
        builder.Property(p => p.Technology).HasMaxLength(Limits.Word);
        builder.Property(p => p.Package).HasMaxLength(Limits.Cell);
        builder.Property(p => p.Source).HasMaxLength(Limits.Cell);
        builder.Property(p => p.Lifecycle).HasConversion<string>().HasMaxLength(Limits.Word);
        builder.Property(p => p.Version).IsConcurrencyToken();
        builder.HasIndex(p => new { p.Family, p.Maker, p.OrderingCode }).IsUnique();
        builder.HasIndex(p => p.Search);
    }
}

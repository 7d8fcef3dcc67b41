using Microsoft.EntityFrameworkCore;
using Microsoft.EntityFrameworkCore.Metadata.Builders;
using Selector.Storage.Entities;

namespace Selector.Storage.Configurations;

internal sealed class SupplyTextConfiguration : IEntityTypeConfiguration<SupplyText>
{
    public void Configure(EntityTypeBuilder<SupplyText> builder)
    {
        builder.ToTable("supply_text");
        builder.HasKey(t => new { t.Supply, t.Field });
        builder.Property(t => t.Field).HasMaxLength(Limits.Field);
        builder.Property(t => t.Text).HasMaxLength(Limits.Text);
        builder.HasOne<SupplyRecord>().WithMany().HasForeignKey(t => t.Supply).OnDelete(DeleteBehavior.Cascade);
    }
}

using Microsoft.EntityFrameworkCore;
using Microsoft.EntityFrameworkCore.Metadata.Builders;
using Selector.Storage.Entities;

namespace Selector.Storage.Configurations;

internal sealed class SupplyEditConfiguration : IEntityTypeConfiguration<SupplyEdit>
{
    public void Configure(EntityTypeBuilder<SupplyEdit> builder)
    {
        builder.ToTable("supply_edit");

        // The key is also the last line of defence: two edits cannot take the same place in the log.
        builder.HasKey(e => new { e.Supply, e.Sequence });
        builder.Property(e => e.Field).HasMaxLength(Limits.Field);
        builder.Property(e => e.Old).HasMaxLength(Limits.Text);
        builder.Property(e => e.New).HasMaxLength(Limits.Text);
        builder.Property(e => e.By).HasMaxLength(Limits.Name);
        builder.HasOne<SupplyRecord>().WithMany().HasForeignKey(e => e.Supply).OnDelete(DeleteBehavior.Cascade);
    }
}

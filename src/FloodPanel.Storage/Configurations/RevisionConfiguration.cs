using FloodPanel.Storage.Entities;
using Microsoft.EntityFrameworkCore;
using Microsoft.EntityFrameworkCore.Metadata.Builders;

namespace FloodPanel.Storage.Configurations;

internal sealed class RevisionConfiguration : IEntityTypeConfiguration<RevisionRow>
{
    public void Configure(EntityTypeBuilder<RevisionRow> builder)
    {
        builder.ToTable("Revisions");

        // The key is the unique index that keeps two savers from writing the same revision.
        builder.HasKey(r => new { r.ProjectId, r.Number });
        builder.HasOne<ProjectRow>().WithMany().HasForeignKey(r => r.ProjectId).OnDelete(DeleteBehavior.Restrict);
    }
}

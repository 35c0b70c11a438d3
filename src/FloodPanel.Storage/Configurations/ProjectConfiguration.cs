using FloodPanel.Storage.Entities;
using Microsoft.EntityFrameworkCore;
using Microsoft.EntityFrameworkCore.Metadata.Builders;

namespace FloodPanel.Storage.Configurations;

internal sealed class ProjectConfiguration : IEntityTypeConfiguration<ProjectRow>
{
    public void Configure(EntityTypeBuilder<ProjectRow> builder)
    {
        builder.ToTable("Projects");
        builder.HasKey(p => p.Id);
        builder.Property(p => p.Id).ValueGeneratedNever();
    }
}

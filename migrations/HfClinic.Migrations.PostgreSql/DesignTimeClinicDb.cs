using HfClinic.Records;
using HfClinic.Records.Storage;
using Microsoft.EntityFrameworkCore;
using Microsoft.EntityFrameworkCore.Design;

namespace HfClinic.Migrations.PostgreSql;

/// <summary>Lets the migration tool build the model; it connects to nothing.</summary>
public sealed class DesignTimeClinicDb : IDesignTimeDbContextFactory<ClinicDb>
{
    public ClinicDb CreateDbContext(string[] args)
    {
        var options = new DbContextOptionsBuilder<ClinicDb>();
        StorageChoice.From("Host=localhost;Database=design").Configure(options);
        return new ClinicDb(options.Options);
    }
}

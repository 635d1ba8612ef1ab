using System.Text;
using Microsoft.EntityFrameworkCore;
using Microsoft.EntityFrameworkCore.Metadata;

namespace BladeLog.Records.Configuration;

/// <summary>Tables and columns in snake case, so that the file reads well in any SQLite shell: <c>WidthM</c> is <c>width_m</c>.</summary>
public static class Naming
{
    public static string Snake(string name)
    {
        var text = new StringBuilder(name.Length + 8);
        for (var i = 0; i < name.Length; i++)
        {
            var startsWord = i > 0 && char.IsAsciiLetterUpper(name[i])
                && (!char.IsAsciiLetterUpper(name[i - 1]) || (i + 1 < name.Length && char.IsAsciiLetterLower(name[i + 1])));
            if (startsWord)
            {
                text.Append('_');
            }

            text.Append(char.ToLowerInvariant(name[i]));
        }

        return text.ToString();
    }

    public static string Table(Type entity) => entity == typeof(VoidFact) ? "void" : Snake(entity.Name);

    public static void Apply(IMutableModel model)
    {
        foreach (var entity in model.GetEntityTypes())
        {
            entity.SetTableName(Table(entity.ClrType));
            foreach (var property in entity.GetProperties())
            {
                property.SetColumnName(Snake(property.Name));
            }
        }
    }
}

namespace HfClinic.Clinical.Sources;

/// <summary>An embedded table is wrong. The message names the file, the row and the reason.</summary>
public sealed class TableFaultException : Exception
{
    public TableFaultException(string file, int row, string reason, Exception? inner = null)
        : base(row > 0 ? $"{file}, row {row}: {reason}" : $"{file}: {reason}", inner)
    {
    }
}

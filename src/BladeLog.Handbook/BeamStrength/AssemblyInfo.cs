using System.Runtime.CompilerServices;

// The tests compare the parts of the series, not only its sum, with the reference.
[assembly: InternalsVisibleTo("BladeLog.Handbook.Tests")]

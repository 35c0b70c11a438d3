using System.Runtime.CompilerServices;

[assembly: InternalsVisibleTo("FloodPanel.Documents.Tests")]

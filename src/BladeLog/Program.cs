var app = WebApplication.Create(args);
app.Run();

/// <summary>The program's entry point; public so that the tests can host it.</summary>
public partial class Program;

using UnitVent.Web.Hosting;

return await CommandLine.Create().Parse(args).InvokeAsync(new() { ProcessTerminationTimeout = null });

public partial class Program;

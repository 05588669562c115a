namespace HfClinic.SeedDemo.Telling;

/// <summary>Something done about a patient at a past moment, through the same verbs as everyone else's.</summary>
/// <param name="Day">Counted back from the last morning.</param>
/// <param name="At">On the clinic's wall clock.</param>
/// <param name="Act">What is done.</param>
internal sealed record Moment(int Day, TimeOnly At, Func<Desk, Task> Act);

using HfClinic.Records.Access;

namespace HfClinic.SeedDemo.Telling;

/// <summary>The people who work in the demo clinic.</summary>
internal sealed record Team(Actor Nurse, Actor Cardiologist);

namespace HfClinic.Records.Exchange;

/// <summary>Why a line did not simply go in, and how to mend it.</summary>
/// <param name="Reason">Short, lower case: it stands in a list.</param>
/// <param name="Mend">What a person can do; empty when nothing needs doing.</param>
internal sealed record LineFault(string Reason, string Mend)
{
    public static readonly LineFault NoNumber = new("no clinic number", "Write the clinic number into the line.");
    public static readonly LineFault UnknownNumber = new("unknown clinic number", "Add the person to the roster first, or correct the number.");
    public static readonly LineFault NoDate = new("no date", "Write the date of the measurement into the line.");
    public static readonly LineFault NotADate = new("date is not readable", "Write it as year-month-day, for example 2026-03-31.");
    public static readonly LineFault NoSuchDate = new("no such date", "Correct the date.");
    public static readonly LineFault EitherDate = new("date can be read two ways", "Say in the mapping whether the day or the month stands first.");
    public static readonly LineFault TwoDigitYear = new("year has two digits only", "Write the year with four digits.");
    public static readonly LineFault NoSuchTime = new("no such time of day", "Correct the time; it is written as 07:05 or 7:05 pm.");
    public static readonly LineFault NoTime = new("no time of day", "Say in the mapping which time to use for lines without one.");
    public static readonly LineFault InTheFuture = new(Readings.ReadingChecks.InTheFuture, "Check the clock of the scale, and correct the date.");
    public static readonly LineFault LongAgo = new("measured more than 20 years ago", "Check the year.");
    public static readonly LineFault UnknownUnit = new("unit not known", "Use kg or lb, and convert the number if it is in another unit.");
    public static readonly LineFault NoUnit = new("no unit", "Say in the mapping which unit weights without one are in.");
    public static readonly LineFault NotANumber = new("weight is not a number", "Correct the number, or ask for a repeat weight.");
    public static readonly LineFault WeightRange = new(Readings.ReadingChecks.WeightRange, "Check the number and its unit, or ask for a repeat weight.");
    public static readonly LineFault PressureOrder = new(Readings.ReadingChecks.PressureOrder, "Check whether the two were swapped.");
    public static readonly LineFault OnePressure = new("only one of the two pressures", "Write both, or neither.");
    public static readonly LineFault Nothing = new("nothing measured on this line", "Leave the line out, or write the values into it.");
    public static readonly LineFault LongDevice = new("device name is longer than 60 characters", "Shorten it.");
    public static readonly LineFault HasLeft = new("measured after the person left the clinic", "Take the person back in Patients, or correct the date.");
    public static readonly LineFault Duplicate = new("on record already", "");
    public static readonly LineFault Later = new("later reading of the same day", "Nothing needs doing: it is kept, and the first reading of the day counts.");

    public static LineFault NotWhole(string name) => new($"{name} is not a whole number", "Correct the number.");


    /// <summary>Several faults of one line as one.</summary>
    public static LineFault Joined(IReadOnlyList<LineFault> faults) => faults.Count == 1
        ? faults[0]
        : new(string.Join("; ", faults.Select(fault => fault.Reason)), string.Join(" ", faults.Select(fault => fault.Mend).Distinct()));
}

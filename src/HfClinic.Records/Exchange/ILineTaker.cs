using HfClinic.Records.Work;

namespace HfClinic.Records.Exchange;

/// <summary>Takes the lines of one kind of file into the record, batch by batch.</summary>
internal interface ILineTaker
{
    /// <summary>Lines taken in one piece of work.</summary>
    int BatchSize { get; }

    /// <summary>Takes a batch inside the piece of work.</summary>
    Task<IReadOnlyList<LineOutcome>> TakeAsync(WorkScope scope, long importId, IReadOnlyList<CsvLine> lines, CancellationToken cancellation);

    /// <summary>The last batch did not hold: forget what was carried from it.</summary>
    void Forget();

    /// <summary>The patients who have to be reassessed once the file is in.</summary>
    IReadOnlyCollection<long> Owed { get; }
}

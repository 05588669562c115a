using System.Collections.Frozen;
using System.Collections.Immutable;
using HfClinic.Clinical.Sources;

namespace HfClinic.Clinical.Medicines;

/// <summary>The table of all medicines the program knows the doses of.</summary>
public sealed class Formulary
{
    private const string File = "formulary.json";

    private readonly FrozenDictionary<string, ImmutableArray<Medicine>> _byName;

    private Formulary(ImmutableArray<Medicine> all)
    {
        All = all;
        _byName = all
            .SelectMany(medicine => Names(medicine).Select(name => (Name: name, Medicine: medicine)))
            .GroupBy(entry => entry.Name, entry => entry.Medicine, StringComparer.OrdinalIgnoreCase)
            .ToFrozenDictionary(group => group.Key, group => group.Distinct().ToImmutableArray(), StringComparer.OrdinalIgnoreCase);
    }

    /// <summary>The formulary built into the program.</summary>
    public static Formulary BuiltIn { get; } = Load();

    /// <summary>In the order of the file.</summary>
    public ImmutableArray<Medicine> All { get; }

    /// <summary>Reads the embedded table.</summary>
    /// <exception cref="TableFaultException">The table is faulty: file, row and reason.</exception>
    public static Formulary Load() => Parse(StrictTable.Text(File), SourceTable.Load());

    /// <inheritdoc cref="Load"/>
    public static Formulary Parse(string json, SourceTable sources) =>
        new(StrictTable.Read<Medicine>(File, json, row => row.FullName, row => FormularyCheck.WhyRefused(row, sources)));

    /// <summary>The medicine of that name and salt; null when there is none. No salt finds only the medicine without one.</summary>
    public Medicine? Find(string name, string? salt = null) => All.FirstOrDefault(medicine =>
        string.Equals(medicine.Name, name, StringComparison.OrdinalIgnoreCase)
        && string.Equals(medicine.Salt, salt, StringComparison.OrdinalIgnoreCase));

    /// <summary>Reads a medicine as recorded, with or without its salt: "metoprolol succinate", "metoprolol".</summary>
    public MedicineMatch Read(string recorded) => new(_byName.GetValueOrDefault(recorded.Trim(), []));

    private static IEnumerable<string> Names(Medicine medicine) => [medicine.FullName, medicine.Name, .. medicine.OtherNames];
}

/// <summary>What a recorded name stands for.</summary>
/// <param name="Candidates">None when the formulary does not know it; several when the salt is missing.</param>
public sealed record MedicineMatch(ImmutableArray<Medicine> Candidates)
{
    /// <summary>The medicine, when there is no doubt. A name without salt is the medicine that has none.</summary>
    public Medicine? Medicine => Candidates.Length == 1 ? Candidates[0] : Candidates.FirstOrDefault(candidate => candidate.Salt is null);

    /// <summary>Several salts share the name, and none was recorded.</summary>
    public bool SaltUnknown => Medicine is null && !Candidates.IsEmpty;

    /// <summary>The class, which all salts share.</summary>
    public MedicineClass? Class => Candidates.IsEmpty ? null : Candidates[0].Class;

    /// <summary>Whether the pillar is counted: with the salt unknown, only when every salt would count.</summary>
    public bool CoversPillar => Medicine?.CoversPillar ?? (!Candidates.IsEmpty && Candidates.All(candidate => candidate.CoversPillar));
}

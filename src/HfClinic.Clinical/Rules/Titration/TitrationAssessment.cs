using System.Collections.Immutable;
using HfClinic.Clinical.Medicines;
using HfClinic.Clinical.Picture;

namespace HfClinic.Clinical.Rules.Titration;

/// <summary>
/// Where every class of medicine with a target stands for one patient. The titration rules and the list of titrations due are both
/// read from it, so that they cannot differ.
/// </summary>
/// <param name="Phenotype">Null when there is no ejection fraction.</param>
/// <param name="Track">The post-discharge track, when it is on.</param>
/// <param name="Classes">The four pillars, and other classes that are taken.</param>
public sealed record TitrationAssessment(Phenotype? Phenotype, PostDischargeTrack? Track, ImmutableArray<ClassTitration> Classes)
{
    public static TitrationAssessment Of(PatientPicture picture, ClinicProtocol protocol)
    {
        var phenotype = Phenotype.Of(picture);
        var facts = new TitrationFacts(picture, protocol);
        var track = PostDischargeTrack.Of(facts);
        var taken = facts.Taken.ToLookup(medicine => TitrationClasses.Of(medicine.Match.Class!.Value));
        var classes = TitrationClasses.All
            .Where(titration => TitrationClasses.Pillars.Contains(titration) || taken[titration].Any())
            .Select(titration => new ClassReading(titration, [.. taken[titration]], phenotype, track, facts).Read());
        return new(phenotype, track, [.. classes]);
    }

    /// <summary>The class's reading, or null when it is neither a pillar nor taken.</summary>
    public ClassTitration? this[TitrationClass titration] => Classes.FirstOrDefault(one => one.Class == titration);
}

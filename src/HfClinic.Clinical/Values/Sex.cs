namespace HfClinic.Clinical.Values;

/// <summary>The sex used by published equations. Where it is not recorded, those equations are not computed.</summary>
public enum Sex
{
    NotRecorded = 0,
    Female = 1,
    Male = 2,
}

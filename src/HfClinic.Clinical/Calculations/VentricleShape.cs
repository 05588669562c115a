namespace HfClinic.Clinical.Calculations;

/// <summary>Shape of the left ventricle by mass index and relative wall thickness (ASE/EACVI 2015; from memory).</summary>
public enum VentricleShape
{
    Normal,
    ConcentricRemodelling,
    ConcentricHypertrophy,
    EccentricHypertrophy,
}

/// <summary>The shapes in words.</summary>
public static class VentricleShapes
{
    public static string Words(VentricleShape shape) => shape switch
    {
        VentricleShape.ConcentricRemodelling => "concentric remodelling",
        VentricleShape.ConcentricHypertrophy => "concentric hypertrophy",
        VentricleShape.EccentricHypertrophy => "eccentric hypertrophy",
        _ => "no hypertrophy, not concentric",
    };
}

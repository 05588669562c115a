namespace HfClinic.Clinical.Tests.Weights;

/// <summary>Seeded standard normal numbers by the polar method (Marsaglia and Bray, SIAM Rev 1964;6:260).</summary>
internal sealed class NormalScores(int seed)
{
    private readonly Random random = new(seed);
    private double? kept;

    public double Next()
    {
        if (kept is double second)
        {
            kept = null;
            return second;
        }

        double x;
        double y;
        double radius;
        do
        {
            x = (2 * random.NextDouble()) - 1;
            y = (2 * random.NextDouble()) - 1;
            radius = (x * x) + (y * y);
        }
        while (radius is >= 1 or 0);

        double factor = Math.Sqrt(-2 * Math.Log(radius) / radius);
        kept = y * factor;
        return x * factor;
    }
}

namespace HfClinic.SeedDemo;

/// <summary>
/// Repeatable chance: the same seed gives the same clinic on every machine.
/// SplitMix64 (Steele, Lea and Flood 2014, "Fast splittable pseudorandom number generators").
/// </summary>
internal sealed class Chance(ulong seed)
{
    private ulong state = seed;
    private double? spareNormal;

    /// <summary>A stream of its own for one patient and one attempt.</summary>
    public static Chance For(int patient, int attempt = 0) =>
        new(new Chance(((ulong)(uint)patient << 20) ^ (uint)attempt ^ 0x5A17_3A25_0000_0000UL).Next());

    /// <summary>From 0, included, to 1, not included.</summary>
    public double Unit() => (Next() >> 11) * (1.0 / (1UL << 53));

    /// <summary>A whole number from 0 to one below the bound.</summary>
    public int Below(int bound) => (int)(Unit() * bound);

    /// <summary>A whole number, both ends included.</summary>
    public int Between(int lowest, int highest) => lowest + Below(highest - lowest + 1);

    public double Between(double lowest, double highest) => lowest + (Unit() * (highest - lowest));

    /// <summary>True with the given probability.</summary>
    public bool Happens(double probability) => Unit() < probability;

    public T Pick<T>(IReadOnlyList<T> among) => among[Below(among.Count)];

    /// <summary>Normally distributed (Box and Muller).</summary>
    public double Normal(double mean = 0, double deviation = 1)
    {
        if (spareNormal is { } spare)
        {
            spareNormal = null;
            return mean + (deviation * spare);
        }

        var radius = Math.Sqrt(-2 * Math.Log(1 - Unit()));
        var angle = 2 * Math.PI * Unit();
        spareNormal = radius * Math.Sin(angle);
        return mean + (deviation * radius * Math.Cos(angle));
    }

    /// <summary>Beta distributed, for whole shapes: two sums of exponentials.</summary>
    public double Beta(int a, int b)
    {
        var first = SumOfExponentials(a);
        return first / (first + SumOfExponentials(b));
    }

    /// <summary>Numbers from 0 to one below the count, in a mixed order.</summary>
    public int[] Shuffled(int count)
    {
        var order = Enumerable.Range(0, count).ToArray();
        for (var i = count - 1; i > 0; i--)
        {
            var j = Below(i + 1);
            (order[i], order[j]) = (order[j], order[i]);
        }

        return order;
    }

    private double SumOfExponentials(int count) => Enumerable.Range(0, count).Sum(_ => -Math.Log(1 - Unit()));

    private ulong Next()
    {
        state += 0x9E37_79B9_7F4A_7C15UL;
        var mixed = (state ^ (state >> 30)) * 0xBF58_476D_1CE4_E5B9UL;
        mixed = (mixed ^ (mixed >> 27)) * 0x94D0_49BB_1331_11EBUL;
        return mixed ^ (mixed >> 31);
    }
}

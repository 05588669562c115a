using HfClinic.Clinical.Weights;
using MathNet.Numerics.LinearAlgebra;

namespace HfClinic.Benchmarks.Trend;

/// <summary>
/// The same two filters and cumulative sums written with the general matrices of MathNet.Numerics, as the yardstick for speed.
/// </summary>
internal sealed class MatrixTrend
{
    private readonly TrendModel model;
    private readonly Filter fluid;
    private readonly Filter slope;
    private readonly double smallestFluidVariance;
    private PersonalScale scale;
    private double up;
    private double down;

    public MatrixTrend(TrendModel model)
    {
        this.model = model;
        double start = model.ReferenceKilograms;
        const double Memory = TrendModel.FluidMemory;
        fluid = new Filter(
            Matrix<double>.Build.DenseOfArray(new[,] { { 1, 1, 0 }, { 0, 1, 0 }, { 0, 0, Memory } }),
            Matrix<double>.Build.DenseOfDiagonalArray([model.MassStep, model.DriftStep, model.FluidStep]),
            Vector<double>.Build.Dense([1, 0, 1]),
            model.ReadingVariance,
            Vector<double>.Build.Dense([start, 0, 0]),
            Matrix<double>.Build.DenseOfDiagonalArray([model.StartMassVariance, model.StartDriftVariance, model.FluidVariance]));
        slope = new Filter(
            Matrix<double>.Build.DenseOfArray(new double[,] { { 1, 1 }, { 0, 1 } }),
            Matrix<double>.Build.DenseOfDiagonalArray([model.Slope.LevelStep, model.Slope.SlopeStep]),
            Vector<double>.Build.Dense([1, 0]),
            model.Slope.ReadingVariance,
            Vector<double>.Build.Dense([start, 0]),
            Matrix<double>.Build.DenseOfDiagonalArray([1, 0.01]));
        smallestFluidVariance = 0.04 * model.FluidVariance;
    }

    /// <summary>Goes one day on with a reading and returns fluid score, excess, slope and rising sum.</summary>
    public (double FluidScore, double Excess, double Slope, double Up) Advance(double kilograms, double target)
    {
        double used = scale.Value;
        double score = fluid.Advance(kilograms);
        slope.Advance(kilograms);
        double cut = Math.Clamp(score / used, -Cusum.LargestScore, Cusum.LargestScore);
        up = Math.Max(0, up + cut - Cusum.Allowance);
        down = Math.Max(0, down - cut - Cusum.Allowance);
        double reached = up;
        up = up > Cusum.Limit ? 0 : up;
        down = down > Cusum.Limit ? 0 : down;
        scale.EndDay(score);
        double spread = Math.Sqrt(Math.Max(model.FluidVariance - fluid.Covariance[2, 2], smallestFluidVariance));
        return (fluid.State[2] / (used * spread), fluid.Seen - target, slope.State[1], reached);
    }

    private sealed class Filter(
        Matrix<double> transition,
        Matrix<double> step,
        Vector<double> observed,
        double readingVariance,
        Vector<double> start,
        Matrix<double> startCovariance)
    {
        private readonly Matrix<double> identity = Matrix<double>.Build.DenseIdentity(start.Count);
        private bool begun;

        public Vector<double> State { get; private set; } = start;

        public Matrix<double> Covariance { get; private set; } = startCovariance;

        public double Seen => observed.DotProduct(State);

        public double Advance(double kilograms)
        {
            if (begun)
            {
                State = transition * State;
                Covariance = (transition * Covariance * transition.Transpose()) + step;
            }

            begun = true;
            double innovation = kilograms - Seen;
            var column = Covariance * observed;
            double variance = observed.DotProduct(column) + readingVariance;
            double score = innovation / Math.Sqrt(variance);
            double noise = readingVariance / Math.Min(1, 5 / (4 + (score * score)));
            var gain = column / (variance - readingVariance + noise);
            State += gain * innovation;
            var rest = identity - gain.OuterProduct(observed);
            Covariance = (rest * Covariance * rest.Transpose()) + (gain.OuterProduct(gain) * noise);
            return score;
        }
    }
}

namespace PartPick.Physics.Steady;

/// <summary>
/// Newton's method on the passes of a follower through its period. A step is taken only as far as the next step, foreseen with
/// the same derivatives, becomes shorter (the natural test; Deuflhard, Newton Methods for Nonlinear Problems, 2004, from memory).
/// </summary>
internal sealed class FollowerShooting
{
    private const int Unknowns = FollowerPass.Unknowns;
    private const int LogAmps = FollowerPass.LogAmps;
    private const int MostPasses = 60;
    private const int MostMeshes = 8;
    private const double LargestLogStep = 0.5;
    private const double SmallestFraction = 1e-3;
    private const double SmallMismatch = 1e-3;
    private const double StepsLeft = 1e-5;
    private const double FarStep = 1;
    private const double FarSlack = 16;
    private readonly FollowerPass _pass;
    private readonly FollowerEquations _equations;
    private readonly double[] _from = new double[Unknowns];
    private readonly double[] _step = new double[Unknowns];
    private readonly double[] _part = new double[Unknowns];
    private readonly double[] _weights = new double[Unknowns];
    private readonly double[] _inverse = new double[Unknowns * Unknowns];

    private readonly double _meshTolerance;

    /// <param name="pass">Makes the passes.</param>
    /// <param name="equations">Says what makes a pass a periodic state.</param>
    /// <param name="meshTolerance">How closely the steps of the period follow the currents.</param>
    public FollowerShooting(FollowerPass pass, FollowerEquations equations, double meshTolerance)
    {
        _meshTolerance = meshTolerance;
        _pass = pass;
        _equations = equations;
        At = new FollowerOrbit(PeriodMesh.Coarsest);
        Now = new FollowerOrbit(At.Mesh);
    }

    /// <summary>The unknowns; the last one is ln of the peak motional current in units of the emitter current at rest.</summary>
    public double[] Values { get; } = new double[Unknowns];

    /// <summary>How the unknowns change along ln I where the amplitude is given.</summary>
    public double[] AlongAmps { get; } = new double[Unknowns];

    /// <summary>The last change of the unknowns.</summary>
    public ReadOnlySpan<double> LastStep => _step;

    /// <summary>The orbit as it is.</summary>
    public FollowerOrbit Now { get; private set; }

    /// <summary>The orbit that the last step started from, with currents and derivatives of its pass.</summary>
    public FollowerOrbit At { get; private set; }

    /// <summary>d ln(−Re Zc)/d ln I of a state solved for its amplitude.</summary>
    public double RunningSlope => 1 / _inverse[LogAmps * Unknowns + LogAmps];

    /// <summary>Gives the room of both orbits back; nothing can be asked of them any more.</summary>
    public void Release()
    {
        Now.Release();
        At.Release();
    }

    /// <summary>Solves for the periodic state, from what is known.</summary>
    /// <param name="resistanceOhms">Rm in ohms; null where the amplitude is given.</param>
    /// <param name="tolerance">Largest last step of a voltage, in thermal voltages.</param>
    /// <param name="slack">How far a step of the period may exceed what its currents ask for.</param>
    public bool Solve(double? resistanceOhms, double tolerance, double slack)
    {
        double before = double.PositiveInfinity;
        double fraction = 1;
        int meshes = 0;
        for (int pass = 0; pass < MostPasses; pass++)
        {
            bool solved = _pass.Run(Now, Values, Math.Exp(Values[LogAmps])) && _equations.Solve(_pass, Values, resistanceOhms);
            double next = solved ? _equations.Size(_inverse, _weights) : double.PositiveInfinity;
            if (!solved || (next > SmallMismatch && next > (1 - fraction / 4) * before))
            {
                fraction /= 2;
                if (fraction < SmallestFraction || double.IsPositiveInfinity(before))
                {
                    return false;
                }

                Take(fraction);
                continue;
            }

            before = Accept();
            if (meshes < MostMeshes && OrbitMeshing.Fit(At, _meshTolerance, before > FarStep ? FarSlack : slack) is { } fitted)
            {
                meshes++;
                before = double.PositiveInfinity;
                Now.Copy(At);
                Use(fitted);
                continue;
            }

            if (before < tolerance && _pass.Left < Math.Max(StepsLeft, tolerance / 10))
            {
                Take(1);
                return true;
            }

            fraction = Math.Min(Math.Min(1, 2 * fraction), LargestLogStep / Math.Max(LargestLogStep, Math.Abs(_step[LogAmps])));
            Take(fraction);
        }

        return false;
    }

    /// <summary>Makes one pass and takes the whole of one step; false where the pass did not come to its end.</summary>
    /// <param name="resistanceOhms">Rm in ohms.</param>
    public bool StepOnce(double resistanceOhms)
    {
        if (!_pass.Run(Now, Values, Math.Exp(Values[LogAmps])) || !_equations.Solve(_pass, Values, resistanceOhms))
        {
            return false;
        }

        Accept();
        Take(1);
        return true;
    }

    /// <summary>Goes along the last derivatives to another amplitude.</summary>
    public void Foresee(double logAmps)
    {
        double log = logAmps - Values[LogAmps];
        for (int k = 0; k < Unknowns; k++)
        {
            _part[k] = AlongAmps[k] * log;
            Values[k] += _part[k];
        }

        Values[LogAmps] = logAmps;
        if (At.Mesh == Now.Mesh)
        {
            Now.Move(At, _part);
        }
    }

    /// <summary>Takes other steps, and the voltages on them from the present ones.</summary>
    public void Use(PeriodMesh mesh)
    {
        At.Copy(Now);
        Now.Use(mesh);
        OrbitMeshing.Interpolate(At, Now);
    }

    private double Accept()
    {
        (At, Now) = (Now, At);
        Values.CopyTo(_from, 0);
        At.Weigh(_weights);
        _weights[LogAmps] = Math.Max(1, _weights[LogAmps]);
        _equations.CopyInverse(_inverse);
        double largest = 0;
        for (int k = 0; k < Unknowns; k++)
        {
            _step[k] = _equations.Step(k);
            AlongAmps[k] = _equations.AlongAmps(k);
            largest = Math.Max(largest, Math.Abs(_step[k]) * _weights[k]);
        }

        return largest;
    }

    private void Take(double fraction)
    {
        for (int k = 0; k < Unknowns; k++)
        {
            _part[k] = fraction * _step[k];
            Values[k] = _from[k] + _part[k];
        }

        Now.Copy(At);
        Now.Move(At, _part);
    }
}

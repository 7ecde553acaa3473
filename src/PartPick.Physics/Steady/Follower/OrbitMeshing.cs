namespace PartPick.Physics.Steady;

/// <summary>Fits the steps of a period to the currents: a step is cut until a cubic follows its currents.</summary>
internal static class OrbitMeshing
{
    private const int Stages = Radau.Stages;
    private const int Voltages = JunctionStep.Voltages;
    private const int FinestFitted = PeriodMesh.FinestLevel - 2;
    private const double CutGain = 16;
    private const double JoinShare = 1.0 / 200;

    /// <summary>The mesh that an orbit asks for; null where it has it.</summary>
    /// <param name="orbit">The orbit, with the currents of a pass.</param>
    /// <param name="tolerance">Third difference of the currents over a step, times its length, as a share of their integral.</param>
    /// <param name="slack">How far a step may exceed that before the mesh is changed.</param>
    public static PeriodMesh? Fit(FollowerOrbit orbit, double tolerance, double slack)
    {
        PeriodMesh mesh = orbit.Mesh;
        Span<int> cuts = mesh.Count <= 512 ? stackalloc int[mesh.Count] : new int[mesh.Count];
        ReadOnlySpan<double> currents = orbit.Currents;
        double total = Integral(mesh, currents);
        bool changes = false;
        for (int step = 0; step < mesh.Count; step++)
        {
            double error = mesh.Length(step) * Difference(mesh, currents, step) / (total * tolerance);
            if (error > 1)
            {
                int wanted = Math.Max(1, (int)Math.Ceiling(Math.Log(error) / Math.Log(CutGain) - 0.2));
                cuts[step] = Math.Max(0, Math.Min(wanted, FinestFitted - mesh.Levels[step]));
                changes |= error > slack && cuts[step] > 0;
            }
            else
            {
                cuts[step] = error < JoinShare && mesh.Levels[step] > PeriodMesh.CoarsestLevel ? -1 : 0;
            }
        }

        return changes ? mesh.Changed(cuts) : null;
    }

    /// <summary>Fills an orbit's voltages from another one's on other steps.</summary>
    public static void Interpolate(FollowerOrbit from, FollowerOrbit to)
    {
        PeriodMesh mesh = from.Mesh;
        ReadOnlySpan<double> volts = from.Volts;
        Span<double> target = to.Volts;
        int step = 0;
        for (int k = 0; k < to.Mesh.Count * Stages; k++)
        {
            double place = to.Mesh.Place(k / Stages, k % Stages);
            while (step > 0 && place <= mesh.Starts[step])
            {
                step--;
            }

            while (step + 1 < mesh.Count && place > mesh.Starts[step + 1])
            {
                step++;
            }

            double t = (place - mesh.Starts[step]) / mesh.Span(step);
            ReadOnlySpan<double> at = volts.Slice(step * Voltages, Voltages);
            ReadOnlySpan<double> last = volts.Slice((step == 0 ? mesh.Count - 1 : step - 1) * Voltages, Voltages);
            int into = k / Stages * Voltages + k % Stages;
            target[into] = Between(t, last[2], at[..Stages]);
            target[into + Stages] = Between(t, last[5], at[Stages..]);
        }
    }

    // A current that a cubic overshoots to would take long to come down from.
    private static double Between(double t, double start, ReadOnlySpan<double> stages)
    {
        double highest = Math.Max(Math.Max(start, stages[0]), Math.Max(stages[1], stages[2]));
        return Math.Min(highest, Radau.Cubic(t, start, stages[0], stages[1], stages[2]));
    }

    private static double Integral(PeriodMesh mesh, ReadOnlySpan<double> currents)
    {
        double total = 0;
        for (int k = 0; k < currents.Length; k++)
        {
            total += currents[k] * Radau.Weights[k % Stages] * mesh.Length(k / Voltages);
        }

        return total;
    }

    private static double Difference(PeriodMesh mesh, ReadOnlySpan<double> currents, int step)
    {
        int before = (step == 0 ? mesh.Count - 1 : step - 1) * Voltages + Stages - 1;
        double sum = 0;
        for (int kind = 0; kind < Voltages; kind += Stages)
        {
            ReadOnlySpan<double> at = currents.Slice(step * Voltages + kind, Stages);
            sum += Math.Abs(
                Radau.ThirdDifference[0] * currents[before + kind]
                + Radau.ThirdDifference[1] * at[0]
                + Radau.ThirdDifference[2] * at[1]
                + Radau.ThirdDifference[3] * at[2]);
        }

        return sum;
    }
}

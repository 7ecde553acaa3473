using System.Collections.Immutable;
using System.Diagnostics;
using PartPick.Catalog;

namespace PartPick.Selection.Search;

/// <summary>One run of the search: what its threads share.</summary>
internal sealed class SearchRun
{
    private readonly RankingOptions _options;
    private readonly bool _leadersOnly;
    private readonly AnswerBuilder _answers;
    private readonly IProgress<RankingResult>? _progress;
    private readonly Stopwatch _watch = Stopwatch.StartNew();
    private readonly Lock _reporting = new();
    private double _nextReport = 0.1;

    /// <param name="space">What is searched.</param>
    /// <param name="options">How much of the answer is wanted.</param>
    /// <param name="progress">Takes a best-so-far now and then; may be null.</param>
    /// <param name="cancellation">Ends the search.</param>
    /// <param name="leadersOnly">Whether the front does not matter.</param>
    public SearchRun(
        SearchSpace space,
        RankingOptions options,
        IProgress<RankingResult>? progress,
        CancellationToken cancellation,
        bool leadersOnly = false)
    {
        _leadersOnly = leadersOnly;
        Space = space;
        _options = options;
        _progress = progress;
        Cancellation = cancellation;
        Prices = new Prices(space);
        decimal cheapest = space.Families.SelectMany(family => family.Members).Select(member => member.BaseCost).DefaultIfEmpty(0).Min();
        Floor = Math.Max(cheapest + Prices.CheapestOfAllPairs(), 1e-6m);
        Leaders = new Leaders(space.Requirement, options.Front ? 1 : options.Top, Floor);
        _answers = new AnswerBuilder(this, options);
        foreach ((Limit limit, double count) in space.Rejections)
        {
            Tally.Reject(limit, count);
            Tally.Cover(count);
        }
    }

    /// <summary>What is searched.</summary>
    public SearchSpace Space { get; }

    /// <summary>Ends the search.</summary>
    public CancellationToken Cancellation { get; }

    /// <summary>Costs.</summary>
    public Prices Prices { get; }

    /// <summary>A cost that no combination undercuts.</summary>
    public decimal Floor { get; }

    /// <summary>The best of each group.</summary>
    public Leaders Leaders { get; }

    /// <summary>The front.</summary>
    public Front Front { get; } = new();

    /// <summary>Every fit combination, where all are wanted.</summary>
    public List<FitPoint> All { get; } = [];

    /// <summary>The choices that came nearest.</summary>
    public NearMisses NearMisses { get; } = new();

    /// <summary>Counts.</summary>
    public Tally Tally { get; } = new();

    /// <summary>Whether figures no better than these could still change the answer.</summary>
    public bool MayEnter(FamilyMember member, double errorRatio, double margin, decimal cost) =>
        _options.All || Leaders.MayLead(member, errorRatio, margin, cost) || (!_leadersOnly && !Front.Beats(errorRatio, margin, cost));

    /// <summary>Adds a fit combination.</summary>
    public void Add(FamilyMember member, FitPoint point)
    {
        Tally.CountFit();
        Leaders.Add(member, point);
        Front.Add(point);
        if (_options.All)
        {
            lock (All)
            {
                All.Add(point);
            }
        }
    }

    /// <summary>The choice of parts of a combination.</summary>
    public static CandidateParts Choice(CircuitFamily family, FamilyMember member, int option, CapacitorPart c1, CapacitorPart c2)
    {
        AmplifierOption resistors = family.Options[option];
        return new CandidateParts
        {
            Circuit = family.Kind,
            Crystal = member.Crystal,
            Amplifier = family.Amplifier,
            Tap = member.Tap,
            C1 = c1,
            C2 = c2,
            Series = resistors.Series,
            BaseTop = resistors.BaseTop,
            BaseBottom = resistors.BaseBottom,
            Emitter = resistors.Emitter,
        };
    }

    /// <summary>Searches all families, the most promising first, on several threads.</summary>
    public RankingResult Run()
    {
        Search();
        return _answers.Build(complete: true, _watch.Elapsed.TotalSeconds);
    }

    /// <summary>Searches, and leaves what it finds in the leaders and the front.</summary>
    public void Search()
    {
        ImmutableArray<CircuitFamily> order =
        [
            .. Space.Families
                .OrderBy(Promise)
                .ThenBy(family => family.Amplifier.Id, StringComparer.Ordinal)
                .ThenBy(family => family.Members[0].Crystal.Id, StringComparer.Ordinal),
        ];
        // A few combinations of every family first: against the best of them the rest of each can be left out sooner.
        var scans = new FamilyScan[order.Length];
        InParallel(order.Length, place =>
        {
            scans[place] = new FamilyScan(this, order[place]);
            Look(order[place], scans[place].Sparse(), scans[place].Grid);
        });
        Cancellation.ThrowIfCancellationRequested();
        InParallel(order.Length, place =>
        {
            SearchRest(order[place], scans[place]);
            scans[place] = null!;
        });
        Cancellation.ThrowIfCancellationRequested();
    }

    /// <summary>Reports a best-so-far now and then.</summary>
    public void Report()
    {
        if (_progress is null || _watch.Elapsed.TotalSeconds < Volatile.Read(ref _nextReport) || !_reporting.TryEnter())
        {
            return;
        }

        try
        {
            _progress.Report(_answers.Build(complete: false, _watch.Elapsed.TotalSeconds));
            Volatile.Write(ref _nextReport, _watch.Elapsed.TotalSeconds + 0.3);
        }
        finally
        {
            _reporting.Exit();
        }
    }

    private void InParallel(int count, Action<int> work)
    {
        int next = 0;
        int threads = Math.Clamp(_options.Threads ?? Environment.ProcessorCount, 1, Math.Max(1, count));
        var workers = new Task[threads - 1];
        for (int i = 0; i < workers.Length; i++)
        {
            workers[i] = Task.Run(WorkUntilCancelled, CancellationToken.None);
        }

        try
        {
            WorkUntilCancelled();
        }
        finally
        {
            Interlocked.Exchange(ref next, count);
            Task.WaitAll(workers, CancellationToken.None);
        }

        void WorkUntilCancelled()
        {
            try
            {
                for (int place = Take(); place < count; place = Take())
                {
                    work(place);
                    Report();
                }
            }
            catch (OperationCanceledException) when (Cancellation.IsCancellationRequested)
            {
                // Every thread ends by itself; the run says so once.
            }
        }

        int Take() => Interlocked.Increment(ref next) - 1;
    }

    private void SearchRest(CircuitFamily family, FamilyScan scan)
    {
        Look(family, scan.Rest(), scan.Grid);
        Tally.Reject(Limit.Margin, scan.MarginRejections * family.Members.Length);
        Tally.Reject(Limit.Error, scan.ErrorRejections * family.Members.Length);
        Tally.Reject(Limit.Drive, scan.DriveRejections * family.Members.Length);
        Tally.Cover(Space.CapacitorPairs * family.Options.Length * family.Members.Length);
    }

    private void Look(CircuitFamily family, List<Spot> spots, EstimateGrid grid)
    {
        foreach (FamilyMember member in family.Members)
        {
            new MemberSearch(this, family, member).Run(spots, grid);
        }
    }

    private double Promise(CircuitFamily family)
    {
        Requirement requirement = Space.Requirement;
        return family.Members.Min(member =>
            requirement.Weights.Error * member.TermsRatio / requirement.BudgetRatio
            + requirement.Weights.Cost * (double)(member.BaseCost / Floor));
    }
}

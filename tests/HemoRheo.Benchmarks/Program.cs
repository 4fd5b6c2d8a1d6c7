using HemoRheo.Benchmarks;
using HemoRheo.Benchmarks.FittedIntervals;
using HemoRheo.Benchmarks.Laws;
using HemoRheo.Benchmarks.Pooled;
using HemoRheo.Benchmarks.Speed;

return args switch
{
    ["coverage", var studies] => Coverage(Number(studies)),
    ["correlation", var studies] => Lines(CorrelationRun.Run(Number(studies))),
    ["intervals", var curves] => Lines(IntervalRun.Run(Number(curves))),
    ["pooled-laws", var studies] => Lines(PooledLawsRun.Run(Number(studies))),
    ["speed"] => Speed(),
    ["speed", "--work", var file] => Lines(WorkSpeed.Run(file)),
    ["bootstrap"] => Lines(BootstrapSpeed.Run()),
    ["hard", var curves] => Lines(HardRun.Run(Number(curves))),
    ["workload", var curves, var file] => Lines([WorkFile.Write(file, Number(curves))]),
    ["nist", "--folder", var folder] => Lines(CertifiedRun.Run(folder)),
    ["chart", var charts] => Lines(ChartRun.Run(Number(charts))),
    ["history", var checks] => Lines(LogRun.Times(Number(checks))),
    ["write-log", var path, var name, var checks] => LogRun.Write(path, name, Number(checks)),
    ["laws", var curves] => Lines(LawSimulations.Run(Number(curves))),
    _ => Usage(),
};

static int Coverage(int studies)
{
    Console.WriteLine($"{studies} simulated studies; per cent of 95 % intervals that hold the truth, by what is left out of the budget");
    Console.WriteLine(CoverageRun.Run(studies).ToText());
    return 0;
}

static int Speed()
{
    Console.WriteLine(FitSpeed.Measure());
    return 0;
}

static int Number(string text) => int.Parse(text, System.Globalization.CultureInfo.InvariantCulture);

static int Lines(IEnumerable<string> lines)
{
    foreach (var line in lines) Console.WriteLine(line);
    return 0;
}

static int Usage()
{
    Console.WriteLine("coverage N   coverage of 95 % intervals over N simulated studies, written, read and analyzed through the public API");
    Console.WriteLine("correlation N   correlated readings over N simulated studies: the correlation found, coverage of the fit's intervals, false alarms of the tests of fit");
    Console.WriteLine("intervals N  coverage of the intervals of one fit by every method, N curves a named truth (a tenth of them for the bootstraps)");
    Console.WriteLine("pooled-laws N   laws compared over N simulated studies: what is said, and intervals with the part of the law and without");
    Console.WriteLine("speed        fits a second on one thread");
    Console.WriteLine("speed --work FILE    Casson and Quemada on every curve of a file, beside MathNet.Numerics");
    Console.WriteLine("bootstrap            one curve drawn and fitted anew 2,000 times");
    Console.WriteLine("hard N               N hard curves, the nine laws in turn: how each ended");
    Console.WriteLine("workload N FILE      writes such a file of N invented curves");
    Console.WriteLine("nist --folder DIR   the 27 certified nonlinear problems from both starts; DIR holds their .dat files");
    Console.WriteLine("chart N   false alarms of the control chart's rules over N simulated charts, and how well changes are dated over N/100");
    Console.WriteLine("history N   times of an instrument's log of N checks");
    Console.WriteLine("write-log PATH NAME N   records N checks in a log; what a test kills");
    Console.WriteLine("laws N       how often comparisons of laws and flow-behavior classes of single curves are right, over N simulated curves a row");
    return 2;
}

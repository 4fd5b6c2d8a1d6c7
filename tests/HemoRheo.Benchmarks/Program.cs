using HemoRheo.Benchmarks;
using HemoRheo.Benchmarks.Pooled;
using HemoRheo.Benchmarks.Speed;

return args switch
{
    ["coverage", var studies] => Coverage(int.Parse(studies, System.Globalization.CultureInfo.InvariantCulture)),
    ["correlation", var studies] => Lines(CorrelationRun.Run(int.Parse(studies, System.Globalization.CultureInfo.InvariantCulture))),
    ["speed"] => Speed(),
    ["nist", "--folder", var folder] => Lines(CertifiedRun.Run(folder)),
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

static int Lines(IEnumerable<string> lines)
{
    foreach (var line in lines) Console.WriteLine(line);
    return 0;
}

static int Usage()
{
    Console.WriteLine("coverage N   coverage of 95 % intervals over N simulated studies, written, read and analyzed through the public API");
    Console.WriteLine("correlation N   correlated readings over N simulated studies: the correlation found, coverage of the fit's intervals, false alarms of the tests of fit");
    Console.WriteLine("speed        fits a second on one thread");
    Console.WriteLine("nist --folder DIR   the 27 certified nonlinear problems from both starts; DIR holds their .dat files");
    return 2;
}

using HemoRheo.Benchmarks;
using HemoRheo.Benchmarks.Speed;

return args switch
{
    ["coverage", var studies] => Coverage(int.Parse(studies, System.Globalization.CultureInfo.InvariantCulture)),
    ["speed"] => Speed(),
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

static int Usage()
{
    Console.WriteLine("coverage N   coverage of 95 % intervals over N simulated studies, written, read and analyzed through the public API");
    Console.WriteLine("speed        fits a second on one thread");
    return 2;
}

namespace HemoRheo.Tests.Cohorts;

/// <summary>Quantities of a law that the study's curves contradict, and groups in which nobody can be used.</summary>
public sealed class ContradictedLawTests
{
    private const string Words = "Casson does not fit: the residuals have a common pattern.";

    [Fact]
    public void A_law_beside_the_deciding_one_gives_one_finding_that_names_its_quantities_and_why()
    {
        var result = Study().Judged();
        var all = result.Findings.Concat(result.Study.Summarize(result).By("group").Findings).Where(finding => finding.Severity != Severity.Note);
        var one = Assert.Single(all);
        Assert.Equal("law-contradicted", one.Code);
        Assert.Contains("Casson yield stress", one.Message, StringComparison.Ordinal);
        Assert.Contains(Words, one.Message, StringComparison.Ordinal);
    }

    [Fact]
    public void The_row_of_such_a_quantity_counts_the_reasons_and_gives_them_for_both_differences()
    {
        var stress = Study().Summarized().Measurands.Single(one => one.Measurand == Measurand.CassonYieldStress);
        Assert.Equal((0, 22), (stress.First.Used, stress.First.People));
        Assert.Equal([new CountedReason("law-does-not-fit", 22)], stress.First.SetAside);
        Assert.Contains("nobody can be used (people left out: 22 law-does-not-fit)", stress.Total.WhyNot!, StringComparison.Ordinal);
        Assert.Equal(stress.Total.WhyNot, stress.Adjusted!.WhyNot);
    }

    [Fact]
    public void Its_undecided_quantities_are_no_small_group()
    {
        var cautions = string.Join(" ", Study().Summarized().Cautions);
        Assert.Contains("Many comparisons", cautions, StringComparison.Ordinal);
        Assert.DoesNotContain("Small groups", cautions, StringComparison.Ordinal);
    }

    [Fact]
    public void A_group_whose_samples_are_all_marked_is_too_small_and_not_said_to_want_a_finer_hematocrit()
    {
        var analyzed = TwoGroups.Case("equal groups", 0.008);
        var marked = analyzed.Samples.Select(sample => sample.Sample.StartsWith("S-p", StringComparison.Ordinal) ? sample with { Status = InstrumentStatus.InDoubt } : sample);
        var summary = (analyzed with { Samples = marked.ToItems() }).Summarized();
        Assert.DoesNotContain(summary.Findings, finding => finding.Kind == CohortFindings.NotAdjusted);
        Assert.Single(summary.Findings, finding => finding.Kind == CohortFindings.GroupTooSmall);
        Assert.Equal("patients: nobody can be used (people left out: 24 instrument-not-in-order).", Assert.Single(summary.Measurands).Adjusted!.WhyNot);
    }

    /// <summary>Two groups of 22 with a viscosity by the deciding law and a yield stress by a law that the curves contradict.</summary>
    private static AnalyzedStudy Study()
    {
        var people = Enumerable.Range(0, 22).Select(i => (-5 + 0.05 * Math.Sin(7 * i), 0.44 + 0.004 * (i - 11)));
        var analyzed = TwoGroups.Of(people, people);
        Finding why = PoolingFindings.LawDoesNotFit.At(Where.Nowhere, Words);
        var samples = analyzed.Samples.Select(sample => sample with
        {
            Values = [sample.Values[0] with { Law = "Quemada" }, sample.Values[0] with { Measurand = Measurand.CassonYieldStress, Decidable = false, Findings = [why] }],
        });
        return analyzed with
        {
            Study = analyzed.Study with { Analysis = analyzed.Study.Analysis with { DecideBy = "Quemada" } },
            Samples = samples.ToItems(),
            Pool = analyzed.Pool with { Laws = [new("Quemada", 44, 440, 440, 0.5, 0.5, true, "Quemada fits."), new("Casson", 44, 9000, 440, 0, 0, false, Words)] },
        };
    }
}

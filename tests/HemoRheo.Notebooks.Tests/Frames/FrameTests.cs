using Deedle;
using HemoRheo.Notebooks.Tests.Reports;

namespace HemoRheo.Notebooks.Tests;

public sealed class FrameTests
{
    [Fact]
    public void A_table_becomes_a_frame_with_numbers_in_full_and_missing_ones_missing()
    {
        var frame = Table.Of("sample", "shear rate").With("S-1", Cell.Rounded(10.123456789, "10")).With("S-2", Cell.Empty).ToFrame();

        Assert.Equal(10.123456789, frame.GetColumn<double>("shear rate [1/s]")[1]);
        Assert.False(frame.GetColumn<double>("shear rate [1/s]").TryGet(2).HasValue);
        Assert.Equal("S-2", frame.GetColumn<string>("sample")[2]);
    }

    [Fact]
    public void The_frame_of_values_has_a_row_a_value()
    {
        var frame = FakeStudy.Result.ValuesFrame();
        var first = FakeStudy.Result.Samples[0].Values[0].Value;

        Assert.Equal(FakeStudy.Result.Samples.Sum(sample => sample.Values.Count), frame.RowCount);
        Assert.Equal(first.Shown, frame.GetColumn<double>("value")[1]);
        Assert.Equal(first.Interval().Lower, frame.GetColumn<double>("lower")[1]);
    }

    [Fact]
    public void Frames_have_no_column_that_says_the_same_in_every_row() => Assert.DoesNotContain("caution", FakeStudy.Result.ValuesFrame().ColumnKeys);

    [Fact]
    public void The_frames_of_points_and_checks_have_a_row_each()
    {
        var curves = FakeStudy.Result.Samples.SelectMany(sample => sample.Result.Loadings).SelectMany(loading => new[] { loading.Curve, loading.OtherRamp }.OfType<FlowCurve>());

        Assert.Equal(curves.Sum(curve => curve.Points.Count + curve.SetAside.Count), FakeStudy.Result.PointsFrame().RowCount);
        Assert.Equal(FakeStudy.Result.Analyzed.Histories.Sum(history => history.Checks.Count), FakeStudy.Result.ChecksFrame().RowCount);
    }

    [Fact]
    public void A_long_frame_says_how_much_is_not_shown_and_encodes_its_texts()
    {
        var frame = Table.Of("sample", "value").WithRows(Enumerable.Range(1, 40), row => [$"<b>{row}</b>", row == 3 ? Cell.Empty : row]).ToFrame();

        var html = FrameMarkup.Of(frame);

        Assert.Contains("15 rows not shown", html, StringComparison.Ordinal);
        Assert.Contains("&lt;b&gt;40&lt;/b&gt;", html, StringComparison.Ordinal);
        Assert.Contains("<i>missing</i>", html, StringComparison.Ordinal);
        Assert.Contains("40 rows x 2 columns", html, StringComparison.Ordinal);
        Assert.Equal("frame: 40 rows x 2 columns", FrameMarkup.Size(frame));
    }
}

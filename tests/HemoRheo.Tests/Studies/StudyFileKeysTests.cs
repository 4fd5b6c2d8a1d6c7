namespace HemoRheo.Tests.Studies;

public sealed class StudyFileKeysTests
{
    [Fact]
    public void The_laws_a_study_file_may_name_are_the_laws_there_are() =>
        Assert.Equal(FlowLaw.All.Select(law => law.Name).Order(StringComparer.Ordinal), StudyFileKeys.All.Single(key => key.Name == "laws").Allowed.Order(StringComparer.Ordinal));

    [Fact]
    public void Only_optional_keys_have_a_default() => Assert.All(StudyFileKeys.All, key => Assert.False(key.Required && key.Default is not null, key.ToString()));

    [Fact]
    public void No_key_stands_twice_in_a_section() => Assert.Equal(StudyFileKeys.All.Count, StudyFileKeys.All.Select(key => (key.Section, key.Name)).Distinct().Count());

    [Fact]
    public void Every_key_says_what_it_means() => Assert.All(StudyFileKeys.All, key => Assert.EndsWith(".", key.Meaning, StringComparison.Ordinal));
}

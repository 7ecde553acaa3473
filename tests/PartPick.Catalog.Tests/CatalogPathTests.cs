namespace PartPick.Catalog.Tests;

public sealed class CatalogPathTests
{
    [Theory]
    [InlineData("/o.db", "/v.db", "/x", "/h", "/o.db")]
    [InlineData(null, "/v.db", "/x", "/h", "/v.db")]
    [InlineData(null, "", "/x", "/h", "/x/partpick/catalog.db")]
    [InlineData(null, null, "relative", "/h", "/h/.local/share/partpick/catalog.db")]
    [InlineData(null, null, null, "/h", "/h/.local/share/partpick/catalog.db")]
    public void The_option_comes_before_the_variable_before_the_data_directory(
        string? option, string? variable, string? data, string? home, string expected)
    {
        Assert.SkipWhen(OperatingSystem.IsWindows(), "The paths of this test are those of Unix.");
        var environment = new Dictionary<string, string?> { ["PARTPICK_CATALOG"] = variable, ["XDG_DATA_HOME"] = data, ["HOME"] = home };
        Assert.Equal(expected, CatalogPath.Resolve(option, environment.GetValueOrDefault).Value);
    }

    [Theory]
    [InlineData("")]
    [InlineData(" ")]
    [InlineData("a\0b")]
    public void An_option_that_is_no_path_is_a_problem(string option) =>
        Assert.Equal("--catalog", CatalogPath.Resolve(option, _ => null).Problem!.Where);

    [Fact]
    public void Without_a_home_there_is_a_problem_that_says_what_to_do() =>
        Assert.Contains("--catalog", CatalogPath.Resolve(null, _ => null).Problem!.Fits, StringComparison.Ordinal);
}

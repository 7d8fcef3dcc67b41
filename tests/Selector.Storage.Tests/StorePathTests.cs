using Selector.Storage.Sqlite;

namespace Selector.Storage.Tests;

public sealed class StorePathTests
{
    private static string Find(string? setting, params (string Name, string Value)[] environment) =>
        StorePath.Find(setting, name => environment.FirstOrDefault(e => e.Name == name).Value);

    [Fact]
    public void A_setting_comes_before_everything() =>
        Assert.Equal("/a/b.db", Find("/a/b.db", ("SELECTOR_STORE", "/c/d.db"), ("XDG_DATA_HOME", "/e")));

    [Fact]
    public void The_variable_comes_before_the_data_folder() =>
        Assert.Equal("/c/d.db", Find("", ("SELECTOR_STORE", "/c/d.db"), ("XDG_DATA_HOME", "/e")));

    [Fact]
    public void The_data_folder_holds_the_store_when_nobody_says() =>
        Assert.Equal("/e/selector/selector.db", Find(null, ("XDG_DATA_HOME", "/e"), ("HOME", "/home/ann")));

    [Fact]
    public void Without_a_data_folder_it_lies_in_the_home() =>
        Assert.Equal("/home/ann/.local/share/selector/selector.db", Find(null, ("HOME", "/home/ann")));

    [Fact]
    public void A_relative_data_folder_is_ignored() =>
        Assert.Equal("/home/ann/.local/share/selector/selector.db", Find(null, ("XDG_DATA_HOME", "e"), ("HOME", "/home/ann")));
}

using Selector.Application.Policies;
using Selector.Engine.Derating;

namespace Selector.Application.Tests.Policies;

public sealed class PolicyShelfTests
{
    private const string Heading = "family,technology,stress,operator,basis,document,place,certainty,note";
    private const string Good = "resistor,film,power,factor 0.5,at-temperature,a document,3.1,second-hand,";

    [Fact]
    public void The_general_industrial_policy_is_there_with_every_clause_of_its_file()
    {
        var shelf = new PolicyShelf();
        var policy = shelf.Standard;
        Assert.Equal(("general-industrial", 1, "General industrial 1"), (policy.Id, policy.Version, policy.Title));
        Assert.True(policy.Clauses.Length > 20);
        Assert.Same(policy, shelf.Find("general-industrial"));
        Assert.Null(shelf.Find("none"));
        Assert.Equal(new ClauseOperator.Factor(0.7), policy.Find("bridge-rectifier", "silicon", "reverse-voltage")!.Operator);
    }

    [Theory]
    [InlineData("resistor,film,power,half,nominal,d,1,second-hand,", "operator")]
    [InlineData("resistor,film,power,factor x,nominal,d,1,second-hand,", "operator")]
    [InlineData("resistor,film,power,factor 0.5,cold,d,1,second-hand,", "basis")]
    [InlineData("resistor,film,power,factor 0.5,nominal,d,1,surely,", "certainty")]
    [InlineData(",film,power,factor 0.5,nominal,d,1,second-hand,", "family")]
    [InlineData("resistor,film,,factor 0.5,nominal,d,1,second-hand,", "stress")]
    [InlineData("resistor,film,power,factor 0.4,nominal,,1,second-hand,", "document")]
    public void A_wrong_cell_is_named_by_row_and_column(string row, string column)
    {
        var reading = PolicyCsv.Read($"{Heading}\ncapacitor,,voltage,factor 0.8,nominal,d,1,from-memory,\n{row}\n");
        var fault = Assert.Single(reading.Faults);
        Assert.Equal((3, column), (fault.Row, fault.Column));
        Assert.Single(reading.Clauses);
    }

    [Fact]
    public void Two_clauses_for_the_same_stress_are_refused()
    {
        var fault = Assert.Single(PolicyCsv.Read($"{Heading}\n{Good}\n{Good}\n").Faults);
        Assert.Equal(3, fault.Row);
    }

    [Fact]
    public void A_policy_file_that_is_wrong_stops_the_program_with_file_row_and_column()
    {
        var e = Assert.Throws<InvalidDataException>(() => new PolicyShelf([("ours", $"{Heading}\nresistor,,power,half,nominal,d,1,second-hand,\n")]));
        Assert.Contains("ours", e.Message, StringComparison.Ordinal);
        Assert.Contains("Row 2, column operator", e.Message, StringComparison.Ordinal);
    }

    [Fact]
    public void The_standing_claims_no_more_than_the_clauses()
    {
        Assert.StartsWith("0 of 1", new PolicyShelf([("ours", $"{Heading}\n{Good}\n")]).Standard.Standing, StringComparison.Ordinal);
        Assert.StartsWith(
            "Common practice", new PolicyShelf([("ours", $"{Heading}\n{Good.Replace("second-hand", "common-practice")}\n")]).Standard.Standing, StringComparison.Ordinal);
    }
}

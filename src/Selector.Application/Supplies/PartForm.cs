using System.Collections.Immutable;
using Selector.Application.Catalogue;
using Selector.Engine.Parts;
using Selector.Storage;

namespace Selector.Application.Supplies;

/// <summary>What was typed for a part of one supply, read.</summary>
/// <param name="Part">Null while anything is wrong.</param>
/// <param name="Faults">What is wrong and what to do, by field.</param>
public sealed record PartFormReading(Part? Part, ImmutableSortedDictionary<string, string> Faults);

/// <summary>A part typed in for one supply: the fields that its family asks for, read as people write them.</summary>
public static class PartForm
{
    public const string Maker = "maker";
    public const string Code = "code";
    public const string Technology = "technology";

    /// <summary>The texts of a part, by field; what is not given is left out.</summary>
    public static ImmutableDictionary<string, string> Texts(Part part)
    {
        ArgumentNullException.ThrowIfNull(part);
        return part.Family.Ratings
            .Select(spec => (spec.Key, Text: RatingCell.Write(spec, part[spec.Key])))
            .Append((Key: Maker, Text: part.Maker))
            .Append((Key: Code, Text: part.OrderingCode))
            .Append((Key: Technology, Text: part.Technology))
            .Where(f => f.Text.Length > 0)
            .ToImmutableDictionary(f => f.Key, f => f.Text, StringComparer.Ordinal);
    }

    /// <summary>Reads all fields; every fault is said at its own.</summary>
    /// <param name="family">Which kind of part.</param>
    /// <param name="texts">By field; a missing one counts as empty.</param>
    public static PartFormReading Read(FamilySpec family, IReadOnlyDictionary<string, string> texts)
    {
        ArgumentNullException.ThrowIfNull(family);
        ArgumentNullException.ThrowIfNull(texts);
        var faults = ImmutableSortedDictionary.CreateBuilder<string, string>(StringComparer.Ordinal);
        var part = new Part
        {
            Family = family,
            Maker = Named(Maker, "maker"),
            OrderingCode = Named(Code, "ordering code"),
            Technology = texts.GetValueOrDefault(Technology) is { Length: > 0 } technology ? technology : family.Technologies[0],
            Source = "typed in",
            Ratings = [.. family.Ratings.Select(Rating)],
        };
        if (faults.Count == 0)
        {
            foreach (var check in PartCheck.Cross(part))
            {
                faults[check.Keys[0]] = check.Message;
            }
        }

        if (faults.Count == 0 && PartCheck.Fault(part) is { } other)
        {
            faults[Technology] = other;
        }

        return new(faults.Count == 0 ? part : null, faults.ToImmutable());

        string Named(string field, string name)
        {
            var text = texts.GetValueOrDefault(field, "").Trim();
            if (text.Length is 0 or > Limits.Cell)
            {
                faults[field] = text.Length == 0 ? $"The {name} is missing. Type it as it must stand on the order." : $"The {name} is longer than {Limits.Cell} characters. Shorten it.";
            }

            return text;
        }

        double Rating(RatingSpec spec)
        {
            var (value, fault) = RatingCell.Read(spec, texts.GetValueOrDefault(spec.Key, ""));
            if ((fault ?? PartCheck.Rating(spec, value)) is { } wrong)
            {
                faults[spec.Key] = wrong;
            }

            return value;
        }
    }
}

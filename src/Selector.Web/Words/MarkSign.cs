using Selector.Documents.Model;

namespace Selector.Web.Words;

/// <summary>The style sheet's names for shapes and colours of the report model.</summary>
internal static class MarkSign
{
    public static string Class(Mark mark) => mark switch
    {
        Mark.Full => "m-full",
        Mark.Half => "m-half",
        Mark.Open => "m-open",
        Mark.Cross => "m-cross",
        _ => "",
    };

    public static string Class(Tone tone) => tone switch
    {
        Tone.Quiet => "t-quiet",
        Tone.Close => "t-close",
        Tone.Lacks => "t-lacks",
        _ => "",
    };
}

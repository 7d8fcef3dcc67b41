namespace Selector.Reference.StepDown;

/// <summary>Looks at every public number of a solution, so that a figure added later is looked at too.</summary>
internal static class Figures
{
    public static bool AllFinite<T>(T solution)
        where T : struct
    {
        object boxed = solution;
        return Fields<T>.Numbers.All(field => double.IsFinite((double)field.GetValue(boxed)!));
    }

    private static class Fields<T>
    {
        public static readonly System.Reflection.FieldInfo[] Numbers =
            [.. typeof(T).GetFields().Where(field => field.FieldType == typeof(double))];
    }
}

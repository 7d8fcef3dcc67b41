namespace Selector.Web.Session;

/// <summary>Who edits while there are no accounts: whoever sits at the machine.</summary>
public static class Owner
{
    public const string Name = "owner";
}

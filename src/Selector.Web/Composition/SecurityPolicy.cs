namespace Selector.Web.Composition;

/// <summary>Headers of every answer. Nothing is loaded from anywhere else and no script or style stands in a page itself.</summary>
internal static class SecurityPolicy
{
    public static HeaderPolicyCollection Headers { get; } = new HeaderPolicyCollection()
        .AddContentTypeOptionsNoSniff()
        .AddFrameOptionsDeny()
        .AddReferrerPolicyNoReferrer()
        .AddCrossOriginOpenerPolicy(p => p.SameOrigin())
        .AddCrossOriginResourcePolicy(p => p.SameOrigin())
        .AddPermissionsPolicy(p =>
        {
            p.AddCamera().None();
            p.AddGeolocation().None();
            p.AddMicrophone().None();
            p.AddPayment().None();
        })
        .RemoveServerHeader()
        .AddContentSecurityPolicy(csp =>
        {
            csp.AddDefaultSrc().None();
            csp.AddScriptSrc().Self();
            csp.AddStyleSrc().Self();
            csp.AddFontSrc().Self();
            csp.AddImgSrc().Self().Data();
            csp.AddConnectSrc().Self();
            csp.AddFormAction().Self();
            csp.AddBaseUri().Self();
            csp.AddObjectSrc().None();
            csp.AddFrameAncestors().None();
        });
}

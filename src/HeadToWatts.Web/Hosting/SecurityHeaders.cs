using System.Security.Cryptography;

namespace HeadToWatts.Web.Hosting;

/// <summary>
/// Tells the browser to load nothing from elsewhere, to let no other site frame or read the pages, and to run no script
/// but this app's own files and the one inline import map that carries the nonce of this answer.
/// </summary>
internal sealed class SecurityHeaders(RequestDelegate next)
{
    private static readonly object NonceKey = new();

    public static string NonceOf(HttpContext? context) => context?.Items[NonceKey] as string ?? "";

    public Task InvokeAsync(HttpContext context)
    {
        var nonce = Convert.ToBase64String(RandomNumberGenerator.GetBytes(18));
        context.Items[NonceKey] = nonce;
        var headers = context.Response.Headers;
        headers.ContentSecurityPolicy =
            $"default-src 'none'; script-src 'self' 'nonce-{nonce}'; style-src 'self' 'unsafe-inline'; img-src 'self' data: blob:; "
            + "font-src 'self'; connect-src 'self'; object-src 'none'; base-uri 'self'; form-action 'self'; frame-ancestors 'none'";
        headers.XContentTypeOptions = "nosniff";
        headers.XFrameOptions = "DENY";
        headers["Referrer-Policy"] = "no-referrer";
        headers["Cross-Origin-Opener-Policy"] = "same-origin";
        headers["Cross-Origin-Resource-Policy"] = "same-origin";
        headers["Permissions-Policy"] = "camera=(), microphone=(), geolocation=(), payment=(), usb=()";
        return next(context);
    }
}

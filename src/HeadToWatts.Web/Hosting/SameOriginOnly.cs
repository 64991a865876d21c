namespace HeadToWatts.Web.Hosting;

/// <summary>
/// Refuses what another site's page sends here: browsers do not apply the same-origin rule to web sockets, so the server
/// compares the Origin itself. Plain reading of a page stays possible; a web socket must name its origin.
/// </summary>
internal sealed class SameOriginOnly(RequestDelegate next)
{
    public Task InvokeAsync(HttpContext context)
    {
        var request = context.Request;
        var opensSocket = context.WebSockets.IsWebSocketRequest
            || request.Headers.Upgrade.Any(v => v?.Contains("websocket", StringComparison.OrdinalIgnoreCase) == true)
            || request.Headers.ContainsKey(":protocol")
            || HttpMethods.IsConnect(request.Method);
        var changes = !(HttpMethods.IsGet(request.Method) || HttpMethods.IsHead(request.Method) || HttpMethods.IsOptions(request.Method));
        var origin = request.Headers.Origin.ToString();
        var own = $"{request.Scheme}://{request.Host}";
        var fromElsewhere = origin.Length > 0 && !string.Equals(origin, own, StringComparison.OrdinalIgnoreCase);
        if ((opensSocket && !string.Equals(origin, own, StringComparison.OrdinalIgnoreCase)) || (changes && fromElsewhere))
        {
            context.Response.StatusCode = StatusCodes.Status403Forbidden;
            return Task.CompletedTask;
        }

        return next(context);
    }
}

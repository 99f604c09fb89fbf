package spanwright.web;

import java.nio.ByteBuffer;
import org.eclipse.jetty.http.HttpHeader;
import org.eclipse.jetty.server.Request;
import org.eclipse.jetty.server.Response;
import org.eclipse.jetty.server.handler.ErrorHandler;
import org.eclipse.jetty.util.Callback;

/** Problem documents for what the HTTP server refuses before any route sees it. */
final class JettyErrors extends ErrorHandler {
  @Override
  public boolean handle(Request request, Response response, Callback callback) {
    int status = response.getStatus() >= 400 ? response.getStatus() : 500;
    byte[] bytes = Errors.bytes(Errors.unexpected(status));
    response.getHeaders().put(HttpHeader.CONTENT_TYPE, "application/problem+json");
    response.getHeaders().put(HttpHeader.CACHE_CONTROL, "no-store");
    Headers.ALWAYS.forEach(response.getHeaders()::put);
    response.write(true, ByteBuffer.wrap(bytes), callback);
    return true;
  }
}

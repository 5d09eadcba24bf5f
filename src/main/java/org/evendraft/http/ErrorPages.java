package org.evendraft.http;

import java.nio.ByteBuffer;
import java.util.List;
import java.util.Optional;
import org.eclipse.jetty.http.HttpHeader;
import org.eclipse.jetty.http.HttpStatus;
import org.eclipse.jetty.server.Request;
import org.eclipse.jetty.server.Response;
import org.eclipse.jetty.server.handler.ErrorHandler;
import org.eclipse.jetty.util.Callback;
import org.evendraft.service.AnswerJson;
import org.evendraft.service.Problem;

/** Problem responses for what the web server turns down before a route sees it: a broken address, headers too large. */
final class ErrorPages extends ErrorHandler {
    @Override
    public boolean handle(Request request, Response response, Callback callback) {
        int status = response.getStatus();
        Problem problem = new Problem(
                "about:blank",
                HttpStatus.getMessage(status),
                status,
                "The request cannot be read: " + HttpStatus.getMessage(status) + ".",
                List.of(),
                Optional.empty());
        response.getHeaders().put(HttpHeader.CONTENT_TYPE, Problem.MEDIA_TYPE);
        response.getHeaders().put(Exchange.NO_SNIFF, "nosniff");
        response.write(true, ByteBuffer.wrap(AnswerJson.bytes(problem)), callback);
        return true;
    }
}

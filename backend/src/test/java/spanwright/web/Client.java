package spanwright.web;

import com.fasterxml.jackson.databind.JsonNode;
import com.fasterxml.jackson.databind.ObjectMapper;
import java.io.IOException;
import java.net.Socket;
import java.net.URI;
import java.net.http.HttpClient;
import java.net.http.HttpRequest;
import java.net.http.HttpRequest.BodyPublishers;
import java.net.http.HttpResponse;
import java.net.http.HttpResponse.BodyHandlers;
import java.nio.charset.StandardCharsets;
import java.time.Duration;

/** Speaks to a server as a program outside would. */
final class Client {
  private static final ObjectMapper JSON = new ObjectMapper();
  private static final HttpClient HTTP =
      HttpClient.newBuilder().connectTimeout(Duration.ofSeconds(5)).build();

  private final int port;

  Client(WebServer server) {
    this.port = server.port();
  }

  /** An answer. */
  record Answer(int status, String body, HttpResponse<?> response) {
    JsonNode json() {
      try {
        return JSON.readTree(body);
      } catch (IOException e) {
        throw new AssertionError(body, e);
      }
    }

    String header(String name) {
      return response.headers().firstValue(name).orElse(null);
    }
  }

  URI uri(String path) {
    return URI.create("http://127.0.0.1:" + port + path);
  }

  Answer get(String path, String... headers) {
    return send("GET", path, null, headers);
  }

  Answer post(String path, String body, String... headers) {
    return send("POST", path, body, headers);
  }

  Answer put(String path, String body, String... headers) {
    return send("PUT", path, body, headers);
  }

  Answer delete(String path, String... headers) {
    return send("DELETE", path, null, headers);
  }

  Answer send(String method, String path, String body, String... headers) {
    HttpRequest.Builder builder =
        HttpRequest.newBuilder(uri(path))
            .timeout(Duration.ofSeconds(60))
            .method(method, body == null ? BodyPublishers.noBody() : BodyPublishers.ofString(body));
    if (headers.length > 0) {
      builder.headers(headers);
    }
    try {
      HttpResponse<String> response = HTTP.send(builder.build(), BodyHandlers.ofString());
      return new Answer(response.statusCode(), response.body(), response);
    } catch (IOException e) {
      throw new AssertionError(method + " " + path, e);
    } catch (InterruptedException e) {
      throw new AssertionError(e);
    }
  }

  /** Sends lines as they are, for requests that no well-behaved client makes. */
  String raw(String request) throws IOException {
    try (Socket socket = new Socket("127.0.0.1", port)) {
      socket.setSoTimeout(10_000);
      socket.getOutputStream().write(request.getBytes(StandardCharsets.ISO_8859_1));
      socket.getOutputStream().flush();
      socket.shutdownOutput();
      return new String(socket.getInputStream().readAllBytes(), StandardCharsets.UTF_8);
    }
  }

  static HttpClient http() {
    return HTTP;
  }
}

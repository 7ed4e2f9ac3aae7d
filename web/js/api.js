/** Questions to the server: each kind has one line, and a new question hangs up on the old one. */

const lines = new Map();

/** What the server refused, or why it could not be reached. */
export class Refused extends Error {
  constructor(status, body) {
    super(body.error);
    this.status = status;
    this.code = body.error ?? "failed";
    this.field = body.field ?? "";
    this.was = body.was ?? "";
    this.allowed = body.allowed ?? "";
  }
}

/** Cancels what is still running on a line. */
export function hangUp(line) {
  lines.get(line)?.abort();
  lines.delete(line);
}

/**
 * Asks on a line. Resolves to null when a later question on the same line took its place.
 *
 * @param line name of the line
 * @param path such as /api/air
 * @param parameters for the query string
 * @param body sent by POST when given: a text as CSV, anything else as JSON
 */
export async function ask(line, path, parameters = {}, body = null) {
  hangUp(line);
  const controller = new AbortController();
  lines.set(line, controller);
  const query = new URLSearchParams(parameters).toString();
  const request = { signal: controller.signal, headers: { Accept: "application/json" } };
  if (body) {
    request.method = "POST";
    const text = typeof body === "string";
    request.headers["Content-Type"] = text ? "text/csv;charset=utf-8" : "application/json";
    request.body = text ? body : JSON.stringify(body);
  }
  try {
    const response = await fetch(query ? `${path}?${query}` : path, request);
    const answer = await response.json();
    if (!response.ok) {
      throw new Refused(response.status, answer);
    }
    return answer;
  } catch (failure) {
    if (failure.name === "AbortError") {
      return null;
    }
    if (failure instanceof Refused) {
      throw failure;
    }
    throw new Refused(0, { error: failure instanceof SyntaxError ? "unreadable" : "unreachable" });
  } finally {
    if (lines.get(line) === controller) {
      lines.delete(line);
    }
  }
}

/** Fetches a file by POST and hands it to the browser to save. */
export async function download(path, body, fileName) {
  const response = await fetch(path, {
    method: "POST",
    headers: { "Content-Type": "application/json" },
    body: JSON.stringify(body),
  });
  if (!response.ok) {
    throw new Refused(response.status, await response.json().catch(() => ({ error: "failed" })));
  }
  const address = URL.createObjectURL(await response.blob());
  const link = document.createElement("a");
  link.href = address;
  link.download = fileName;
  link.click();
  setTimeout(() => URL.revokeObjectURL(address), 60_000);
}

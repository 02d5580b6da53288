import { once } from "node:events";
import { createServer, type IncomingMessage, request, type Server, type ServerResponse } from "node:http";
import type { AddressInfo } from "node:net";

/** What the network between phone and server is doing to them. */
export type Weather =
  | { readonly type: "clear" }
  /** every connection is broken off */
  | { readonly type: "cut" }
  /** connections are taken, and nobody ever answers */
  | { readonly type: "half-open" }
  /** the server is asked and does its work; its answer to a sending never arrives */
  | { readonly type: "answer-lost" }
  /** somebody else's page answers for everything, as in a harbour's guest network */
  | { readonly type: "portal"; readonly status: 200 | 302 }
  /** each sending is refused with this status */
  | { readonly type: "refusing"; readonly status: number };

const sending = /^\/api\/v1\/(sync|devices)/;

/** A stretch of network before a server: one address that never changes, and weather on the way. */
export class FaultyProxy {
  private weather: Weather = { type: "clear" };
  private behind = 0;
  /** how many sendings have gone through to the server */
  passed = 0;
  /** called when a sending with events has been handed to the server, before it answers */
  onSending: (() => void) | null = null;

  private constructor(private readonly server: Server) {
    server.on("request", (incoming, answer) => this.pass(incoming, answer));
  }

  static async make(): Promise<FaultyProxy> {
    const server = createServer();
    server.listen(0);
    await once(server, "listening");
    return new FaultyProxy(server);
  }

  get url(): string {
    return `http://localhost:${(this.server.address() as AddressInfo).port}`;
  }

  leadsTo(port: number): void {
    this.behind = port;
  }

  /** From now on; what hangs on the line is cut, as when the weather changes. */
  turns(weather: Weather): void {
    this.weather = weather;
    this.server.closeAllConnections();
  }

  async remove(): Promise<void> {
    this.server.closeAllConnections();
    this.server.close();
    await once(this.server, "close");
  }

  private pass(incoming: IncomingMessage, answer: ServerResponse): void {
    const { weather } = this;
    const isSending = sending.test(incoming.url ?? "");
    if (weather.type === "cut") incoming.socket.destroy();
    else if (weather.type === "portal") portal(answer, weather.status);
    else if (weather.type === "refusing" && isSending) refused(answer, weather.status);
    else if (weather.type !== "half-open") this.forward(incoming, answer, weather.type === "answer-lost" && isSending);
  }

  private forward(incoming: IncomingMessage, answer: ServerResponse, isLost: boolean): void {
    const { url: path, method, headers } = incoming;
    const onward = request({ port: this.behind, path, method, headers }, (reply) => {
      if (isLost) return void incoming.socket.destroy();
      answer.writeHead(reply.statusCode ?? 502, reply.headers);
      reply.pipe(answer);
      reply.on("error", () => incoming.socket.destroy());
    });
    onward.on("error", () => incoming.socket.destroy());
    incoming.pipe(onward);
    if (!path?.startsWith("/api/v1/sync")) return;
    incoming.on("end", () => {
      this.passed += 1;
      this.onSending?.();
    });
  }
}

function portal(answer: ServerResponse, status: 200 | 302): void {
  answer.writeHead(status, { "content-type": "text/html", ...(status === 302 ? { location: "http://portal.example/welcome" } : {}) });
  answer.end("<!doctype html><title>Welcome to the harbour</title><p>Accept the terms to go on.");
}

function refused(answer: ServerResponse, status: number): void {
  answer.writeHead(status, { "content-type": "application/json" });
  answer.end(JSON.stringify({ error: "not now" }));
}

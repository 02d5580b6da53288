import type { BrowserContext, ConsoleMessage } from "@playwright/test";

/** What a browser writes when a server it asks is not there. */
const unreachable =
  /net::ERR_(CONNECTION_REFUSED|CONNECTION_RESET|CONNECTION_CLOSED|EMPTY_RESPONSE|INCOMPLETE_CHUNKED_ENCODING|INTERNET_DISCONNECTED|FAILED)/;

/** Listens to every page of a browser and keeps each error; the test asks for them at its end. */
export class ConsoleWatch {
  private readonly heard: string[] = [];
  private isServerDown = false;
  private questionsExpected = 0;

  constructor(context: BrowserContext) {
    context.on("console", (message) => this.hearMessage(message));
    context.on("weberror", (error) => this.heard.push(`uncaught: ${error.error().stack ?? error.error().message}`));
  }

  /** Everything that went wrong and was not the missing server's doing. */
  get errors(): readonly string[] {
    return this.heard;
  }

  /** From here on until `serverIsBack`, requests that reach nobody are meant to fail; nothing else is. */
  serverIsDown(): void {
    this.isServerDown = true;
  }

  serverIsBack(): void {
    this.isServerDown = false;
  }

  /** A browser killed before it had written its cookies is asked once who it is, and says so in its console. */
  mayBeAskedToSignIn(): void {
    this.questionsExpected += 1;
  }

  private hearMessage(message: ConsoleMessage): void {
    if (message.type() !== "error") return;
    const isExpected = (this.isServerDown && unreachable.test(message.text())) || this.isQuestion(message);
    if (!isExpected) this.heard.push(`${message.text()} (${message.location().url})`);
  }

  private isQuestion(message: ConsoleMessage): boolean {
    const isAsked = message.text().includes("401") && message.location().url.endsWith("/api/v1/sync");
    if (!isAsked || this.questionsExpected === 0) return false;
    this.questionsExpected -= 1;
    return true;
  }
}

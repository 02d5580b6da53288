import { describe, expect, it } from "vitest";
import { photographsOwedInWords, queueWords, type Reach } from "@/lib/sync/queue-words";

const words = (unsent: number, onServer: number, quarantined: number, reach: Reach = "reached", confirmed = 0) =>
  queueWords({ unsent, onServer, confirmed, quarantined }, reach);

describe("the state of the queue in words", () => {
  it("says that nothing was saved yet, whether anybody can be reached or not", () => {
    expect(words(0, 0, 0)).toBe("Nothing saved on this phone yet");
    expect(words(0, 0, 0, "sign-in-needed")).toBe("Nothing saved on this phone yet");
  });

  it("says how many wait, and never calls them sent", () => {
    expect(words(3, 5, 0)).toBe("3 saved on this phone, not sent yet");
    expect(words(3, 5, 0, "no-answer")).toBe("3 saved on this phone, not sent yet");
    expect(words(1, 0, 2)).toBe("1 saved on this phone, not sent yet; 2 set aside by the server");
  });

  it("says that all are on the server, and how many of them count for nothing yet", () => {
    expect(words(0, 41, 0)).toBe("All 41 on the server");
    expect(words(0, 0, 1)).toBe("All 1 on the server; 1 set aside by the server");
    expect(words(0, 39, 2)).toBe("All 41 on the server; 2 set aside by the server");
  });

  it("says how many of those on the server are in a backup", () => {
    expect(words(0, 41, 0, "reached", 12)).toBe("All 41 on the server, 12 backed up");
    expect(words(0, 41, 0, "reached", 41)).toBe("All 41 on the server, backed up");
    expect(words(0, 39, 2, "reached", 39)).toBe("All 41 on the server, backed up; 2 set aside by the server");
    expect(words(3, 41, 0, "reached", 41)).toBe("3 saved on this phone, not sent yet");
  });

  it("asks for a sign-in only where something waits for it, and says that readings go on", () => {
    expect(words(3, 5, 0, "sign-in-needed")).toBe("3 saved on this phone: sign in to send. Readings go on");
    expect(words(0, 5, 0, "sign-in-needed")).toBe("All 5 on the server");
  });
});

it("photographs still owed are counted in words", () => {
  expect([0, 1, 2].map(photographsOwedInWords)).toEqual(["", "1 photograph still on this phone", "2 photographs still on this phone"]);
});

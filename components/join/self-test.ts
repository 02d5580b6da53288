export type Check = { readonly name: string; readonly passed: boolean; readonly words: string };

/** Whether this browser can keep readings safe without signal, part by part, in words. Every part is tried and not only asked for. */
export async function selfTest(): Promise<readonly Check[]> {
  return [secureContext(), worker(), locks(), await keys(), await storage()];
}

function secureContext(): Check {
  const words = isSecureContext
    ? "This page came over a connection the phone trusts."
    : "The connection is not trusted. Open the server's own https name, with its certificate installed on the phone.";
  return { name: "Secure page", passed: isSecureContext, words };
}

function worker(): Check {
  const passed = "serviceWorker" in navigator;
  return {
    name: "Pages without signal",
    passed,
    words: passed ? "The pages can be kept on this phone." : "This browser keeps no pages. Use another one, and no private window.",
  };
}

function locks(): Check {
  const passed = "locks" in navigator;
  return {
    name: "One writer at a time",
    passed,
    words: passed ? "Two tabs can't count over each other." : "This browser is too old: two tabs could count over each other.",
  };
}

/** An unsigned phone may read; its events are marked everywhere, so this part warns and does not stop. */
async function keys(): Promise<Check> {
  try {
    await crypto.subtle.generateKey({ name: "ECDSA", namedCurve: "P-256" }, false, ["sign"]);
    return { name: "Signature", passed: true, words: "Readings will be signed with a key that cannot leave this phone." };
  } catch {
    return { name: "Signature", passed: false, words: "This browser makes no keys: readings will be marked as unsigned." };
  }
}

function storage(): Promise<Check> {
  const name = "Storage";
  return new Promise((done) => {
    const failed = () =>
      done({ name, passed: false, words: "This browser does not store. Leave the private window, free some space, and come back." });
    try {
      const opening = indexedDB.open("battenbook-self-test", 1);
      opening.onerror = failed;
      opening.onsuccess = () => {
        opening.result.close();
        indexedDB.deleteDatabase("battenbook-self-test");
        done({ name, passed: true, words: "Readings can be kept on this phone's disk." });
      };
    } catch {
      failed();
    }
  });
}

/** What must pass before reading may start: everything but the signature, whose lack is only marked. */
export function mayStart(checks: readonly Check[]): boolean {
  return checks.every(({ name, passed }) => passed || name === "Signature");
}

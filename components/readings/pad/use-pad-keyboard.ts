import { useEffect, useRef } from "react";
import { keyPressed, type PadKey } from "./typed-keys";

/** Lets a real keyboard, where one is plugged in, press the pad's keys. */
export function usePadKeyboard(onKey: (key: PadKey) => void, onEnter: (() => void) | null): void {
  const latest = useRef({ onKey, onEnter });
  useEffect(() => {
    latest.current = { onKey, onEnter };
  });
  useEffect(() => {
    const pressed = (event: KeyboardEvent) => {
      if (event.ctrlKey || event.metaKey || event.altKey || isTypingPlace(event.target)) return;
      const key = keyPressed(event.key);
      if (key) latest.current.onKey(key);
      else if (event.key === "Enter" && !isButton(event.target)) latest.current.onEnter?.();
      else return;
      event.preventDefault();
    };
    addEventListener("keydown", pressed);
    return () => removeEventListener("keydown", pressed);
  }, []);
}

function isTypingPlace(target: EventTarget | null): boolean {
  return target instanceof HTMLElement && (target.isContentEditable || ["INPUT", "TEXTAREA", "SELECT"].includes(target.tagName));
}

function isButton(target: EventTarget | null): boolean {
  return target instanceof HTMLElement && ["BUTTON", "A"].includes(target.tagName);
}

import type { Config } from "tailwindcss";

/**
 * The identity, made from the work itself: sailcloth (ground), ink (text), red-lead (what you must do now),
 * batten (the wooden strip). Values live in app/globals.css, once per light (deck, below).
 */
export default {
  content: ["./app/**/*.tsx", "./components/**/*.tsx"],
  theme: {
    colors: {
      transparent: "transparent",
      current: "currentColor",
      sailcloth: { DEFAULT: "var(--sailcloth)", raised: "var(--sailcloth-raised)", sunken: "var(--sailcloth-sunken)" },
      ink: { DEFAULT: "var(--ink)", soft: "var(--ink-soft)", line: "var(--ink-line)" },
      redlead: { DEFAULT: "var(--redlead)", text: "var(--redlead-text)", wash: "var(--redlead-wash)", on: "var(--redlead-on)" },
      batten: { DEFAULT: "var(--batten)", edge: "var(--batten-edge)", grain: "var(--batten-grain)", ink: "var(--batten-ink)" },
      port: { DEFAULT: "var(--port)", wash: "var(--port-wash)" },
      starboard: { DEFAULT: "var(--starboard)", wash: "var(--starboard-wash)" },
    },
    fontFamily: {
      sans: ["var(--font-b612)", "system-ui", "sans-serif"],
      mono: ["var(--font-b612-mono)", "ui-monospace", "monospace"],
    },
    fontSize: {
      small: ["0.8125rem", "1.125rem"],
      base: ["0.9375rem", "1.375rem"],
      large: ["1.125rem", "1.5rem"],
      title: ["1.5rem", "1.875rem"],
      figure: ["2rem", "2.25rem"],
      signal: ["3rem", "3.25rem"],
      beacon: ["6rem", "6rem"],
    },
    borderRadius: { none: "0", sm: "2px", DEFAULT: "4px", lg: "8px", full: "9999px" },
    extend: {
      minHeight: { key: "56px", tap: "44px" },
      minWidth: { key: "56px", tap: "44px" },
      maxWidth: { page: "80rem", hand: "30rem" },
    },
  },
} satisfies Config;

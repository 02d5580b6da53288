import type { Metadata, Viewport } from "next";
import localFont from "next/font/local";
import Script from "next/script";
import type { ReactNode } from "react";
import "./globals.css";

const b612 = localFont({
  variable: "--font-b612",
  src: [
    { path: "../node_modules/@fontsource/b612/files/b612-latin-400-normal.woff2", weight: "400" },
    { path: "../node_modules/@fontsource/b612/files/b612-latin-700-normal.woff2", weight: "700" },
  ],
});
const b612Mono = localFont({
  variable: "--font-b612-mono",
  src: [
    { path: "../node_modules/@fontsource/b612-mono/files/b612-mono-latin-400-normal.woff2", weight: "400" },
    { path: "../node_modules/@fontsource/b612-mono/files/b612-mono-latin-700-normal.woff2", weight: "700" },
  ],
});

export const metadata: Metadata = {
  title: { default: "Battenbook", template: "%s · Battenbook" },
  description: "From batten to lightship: the readings, the line and the lightship of an inclining test.",
};

export const viewport: Viewport = {
  width: "device-width",
  initialScale: 1,
  viewportFit: "cover",
  themeColor: [
    { media: "(prefers-color-scheme: light)", color: "#f6f1e4" },
    { media: "(prefers-color-scheme: dark)", color: "#0a1214" },
  ],
};

export default function RootLayout({ children }: { children: ReactNode }) {
  return (
    <html lang="en" className={`${b612.variable} ${b612Mono.variable}`} suppressHydrationWarning>
      <body className="bg-sailcloth text-ink">
        <Script src="/light.js" strategy="beforeInteractive" />
        {children}
      </body>
    </html>
  );
}

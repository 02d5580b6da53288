/** Port is red and starboard green as on every ship, always with the letter and on the side where it stands. */
export function Side({ side }: { side: "port" | "starboard" }) {
  const look = side === "port" ? "border-port bg-port-wash text-port" : "border-starboard bg-starboard-wash text-starboard";
  return (
    <abbr title={side} className={`inline-grid h-6 w-6 place-items-center rounded-sm border font-bold text-small no-underline ${look}`}>
      {side === "port" ? "P" : "S"}
    </abbr>
  );
}

import { createServer } from "node:net";

/** The port that PORT names, or 3000; refuses what is no port and one that somebody else listens on. */
export async function wantedPort() {
  const text = process.env.PORT ?? "3000";
  const port = Number(text);
  if (!Number.isInteger(port) || port < 1 || port > 65_535) throw new Error(`PORT must be a whole number from 1 to 65535, not "${text}".`);
  const problem = await listeningProblem(port);
  if (problem === "EADDRINUSE") throw new Error(`Port ${port} is taken by another program. Choose another: PORT=${port + 1} npm run app`);
  if (problem === "EACCES") throw new Error(`Port ${port} is reserved for the system. Choose one above 1023: PORT=3000 npm run app`);
  if (problem !== null) throw new Error(`Port ${port} can't be used (${problem}).`);
  return port;
}

function listeningProblem(port) {
  return new Promise((resolve) => {
    const server = createServer();
    server.once("error", (error) => resolve(error.code));
    server.listen(port, () => server.close(() => resolve(null)));
  });
}

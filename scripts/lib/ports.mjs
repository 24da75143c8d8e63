import { createServer } from 'node:net';
import { Plain } from './steps.mjs';

/** PORT, or the usual one. */
export function wantedPort(usual) {
  const port = Number(process.env.PORT ?? usual);
  if (!Number.isInteger(port) || port < 1 || port > 65_535) {
    throw new Plain(
      `PORT is ${process.env.PORT}, which is no port. Give a number from 1 to 65535.`,
    );
  }
  return port;
}

/** Fails in plain words when someone listens on the port. */
export async function ensureFree(port) {
  const failure = await new Promise((resolve) => {
    const probe = createServer();
    probe.once('error', resolve);
    probe.listen(port, () => probe.close(() => resolve(null)));
  });
  if (failure === null) return;
  const why = failure.code === 'EACCES' ? 'may not be used by this user' : 'is taken';
  throw new Plain(`Port ${port} ${why}. Choose another: PORT=${port + 1} npm start`);
}

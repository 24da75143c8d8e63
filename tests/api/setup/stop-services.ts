import { rmSync } from 'node:fs';
import './services';

export default async function stopServices(): Promise<void> {
  const services = globalThis.scantlingServices;
  if (!services) return;
  await services.stop();
  rmSync(services.dir, { recursive: true, force: true });
}

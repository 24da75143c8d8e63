/** A failure with one line for the reader and no stack. */
export class Plain extends Error {}

const seconds = (since) => ((performance.now() - since) / 1000).toFixed(1).padStart(5) + ' s';

/**
 * Runs one step and prints its line: the name first, so that a slow step is seen to be running, then
 * its seconds. `work` may return a word for the line.
 */
export async function step(name, work) {
  const since = performance.now();
  const label = `  ${name.padEnd(26, ' ')}`;
  const live = process.stdout.isTTY;
  if (live) process.stdout.write(`${label} …`);
  try {
    const word = await work();
    process.stdout.write(`${live ? '\r' : ''}${label} ${seconds(since)}  ${word ?? ''}\n`);
  } catch (error) {
    process.stdout.write(`${live ? '\r' : ''}${label} ${seconds(since)}  failed\n`);
    throw error;
  }
}

/** Prints a failure: its one line when it has one, else all of it. */
export function sayFailure(error) {
  console.error(error instanceof Plain ? `\n${error.message}` : error);
}

/** Ends with a message on a Node this project does not run on. */
export function checkNode() {
  const [major, minor] = process.versions.node.split('.').map(Number);
  if (major < 20 || (major === 20 && minor < 19)) {
    console.error(`Scantling needs Node 20.19 or later 20.x; this is ${process.versions.node}.`);
    process.exit(1);
  }
  if (major > 20) console.log(`Made for Node 20; this is ${process.versions.node}.`);
}

/** The S3 client warns of Node 20 at every start; its version is pinned with that in mind. */
export function quietAboutNode() {
  process.env.AWS_SDK_JS_NODE_VERSION_SUPPORT_WARNING_DISABLED ??= 'true';
}

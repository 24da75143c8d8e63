// Builds the web app into dist/ when its sources changed, as `npm start` does.
import { ensureWebApp } from './lib/web-app.mjs';
import { sayFailure, step } from './lib/steps.mjs';

try {
  await step('web app', ensureWebApp);
} catch (error) {
  sayFailure(error);
  process.exit(1);
}

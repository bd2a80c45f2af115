// npm start on a fresh checkout: says what is missing instead of a stack trace.
import { existsSync } from 'node:fs';

if (!existsSync('dist/server/index.js')) {
  process.stderr.write('Tallyloft is not built yet. Run: npm ci && npm run build\n');
  process.exit(1);
}

import { register } from 'tsx/esm/api';

// Lets a worker thread run from TypeScript, in development and tests: in Node 20 `--import tsx` does not
// reach a worker's own file.
register();

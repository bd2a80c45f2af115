import '@testing-library/jest-dom/vitest';
import { cleanup } from '@testing-library/react';
import { afterEach } from 'vitest';
import { failOnConsoleErrors } from './console-guard.ts';

failOnConsoleErrors();
afterEach(cleanup);

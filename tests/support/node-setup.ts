import { failOnConsoleErrors } from './console-guard.ts';

failOnConsoleErrors();

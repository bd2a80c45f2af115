import type { FieldProblem } from '../../components/ErrorSummary.tsx';

/** Checked without the schemas, which would weigh more than the rest of this page. */
export const whatIsMissing = (email: string, password: string): readonly FieldProblem[] => [
  ...(/^\S+@\S+$/.test(email.trim())
    ? []
    : [{ path: 'email', label: 'E-mail', message: 'Type an address such as name@example.org' }]),
  ...(password === '' ? [{ path: 'password', label: 'Password', message: 'Type your password' }] : []),
];

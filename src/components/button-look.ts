export type ButtonLook = 'main' | 'line' | 'danger' | 'quiet';

const shape =
  'inline-flex items-center justify-center gap-2 border px-4 py-2 min-h-10 font-semibold leading-6 text-center no-underline transition-colors disabled:cursor-not-allowed disabled:border-rule disabled:bg-film disabled:text-ink-soft';

const looks: Readonly<Record<ButtonLook, string>> = {
  main: 'border-layout bg-layout text-paper hover:border-ink hover:bg-ink',
  line: 'border-ink bg-paper text-ink hover:bg-ink hover:text-paper',
  danger: 'border-brick bg-paper text-brick hover:bg-brick hover:text-paper',
  quiet: 'border-transparent bg-transparent px-2 text-layout underline-offset-4 hover:underline',
};

export const buttonLook = (look: ButtonLook): string => `${shape} ${looks[look]}`;

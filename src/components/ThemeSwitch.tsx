import { Lamp, Sun } from 'lucide-react';
import { isLamplight, useTheme } from '../theme/theme-context.tsx';

export function ThemeSwitch() {
  const { choice, setChoice } = useTheme();
  const lamplight = isLamplight(choice);
  const Icon = lamplight ? Sun : Lamp;
  const does = lamplight ? 'Switch to daylight' : 'Switch to lamplight';
  return (
    <button
      type="button"
      onClick={() => setChoice(lamplight ? 'light' : 'lamplight')}
      aria-label={does}
      title={does}
      className="grid size-9 shrink-0 place-items-center border border-transparent text-ink-soft hover:border-ink hover:text-ink"
    >
      <Icon size={20} strokeWidth={1.5} aria-hidden="true" />
    </button>
  );
}

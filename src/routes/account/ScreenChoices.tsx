import { RadioCards } from '../../components/RadioCards.tsx';
import { type ThemeChoice, useTheme } from '../../theme/theme-context.tsx';
import { useUnits } from '../../units/units-context.tsx';

const unitCards = [
  { value: 'mm', label: 'Millimetres', detail: '6.35 mm, 1 200 mm/min' },
  { value: 'in', label: 'Inches', detail: '1/4 in, 47.2 in/min' },
];

const themeCards = [
  { value: 'system', label: 'As this device', detail: 'Changes when the device does' },
  { value: 'light', label: 'Daylight', detail: 'Dark lines on pale film' },
  { value: 'lamplight', label: 'Lamplight', detail: 'Pale lines on a dark sheet' },
];

const isThemeChoice = (text: string): text is ThemeChoice =>
  text === 'system' || text === 'light' || text === 'lamplight';

/** Kept on this device, since a phone in the shop is not the desk at home. */
export function ScreenChoices() {
  const { system, setSystem } = useUnits();
  const { choice, setChoice } = useTheme();
  return (
    <section aria-labelledby="this-device" className="space-y-4">
      <div>
        <h2 id="this-device" className="text-xl leading-7">
          On this device
        </h2>
        <p className="text-ink-soft">Whatever is chosen, every field reads either: 6.35mm or 1/4 in.</p>
      </div>
      <RadioCards
        legend="Units"
        name="units"
        cards={unitCards}
        value={system}
        onChange={(event) => setSystem(event.target.value === 'in' ? 'in' : 'mm')}
      />
      <RadioCards
        legend="Theme"
        name="theme"
        cards={themeCards}
        value={choice}
        onChange={(event) => isThemeChoice(event.target.value) && setChoice(event.target.value)}
      />
    </section>
  );
}

import { setTheme, useTheme } from './field/theme';
import { useWords } from './words';

const systemIsDark = () => window.matchMedia('(prefers-color-scheme: dark)').matches;

/** Day or night by hand; until used, the screen follows the system. */
export function ThemeSwitch({ className = '' }: { className?: string }) {
  const { t } = useWords();
  const theme = useTheme();
  const night = theme === 'auto' ? systemIsDark() : theme === 'night';
  return (
    <button type="button" onClick={() => setTheme(night ? 'day' : 'night')} className={className}>
      {night ? t('app.day') : t('app.night')}
    </button>
  );
}

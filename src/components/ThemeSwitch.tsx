import { useTheme } from './theme';
import { useWords } from './words';

/** Day or night by hand; until used, the screen follows the system. */
export function ThemeSwitch({ className = '' }: { className?: string }) {
  const { t } = useWords();
  const [theme, choose] = useTheme();
  return (
    <button type="button" onClick={() => choose(theme === 'day' ? 'night' : 'day')} className={className}>
      {theme === 'day' ? t('app.night') : t('app.day')}
    </button>
  );
}

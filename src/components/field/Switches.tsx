import { language as languages } from '../../../shared/api/common';
import { useWords } from '../words';
import { fieldButtonClass } from './fieldButtonClass';
import { setTheme, themes, useTheme } from './theme';

interface ChoiceRowProps<T extends string> {
  legend: string;
  options: readonly T[];
  chosen: T;
  words: (option: T) => string;
  onChoose: (option: T) => void;
}

function ChoiceRow<T extends string>({ legend, options, chosen, words, onChoose }: ChoiceRowProps<T>) {
  return (
    <div role="group" aria-label={legend} className="flex gap-2 [&>*]:flex-1">
      {options.map((option) => (
        <button
          key={option}
          type="button"
          aria-pressed={option === chosen}
          className={fieldButtonClass(option === chosen ? 'primary' : 'quiet')}
          onClick={() => {
            onChoose(option);
          }}
        >
          {words(option)}
        </button>
      ))}
    </div>
  );
}

/** Day or night, and the language: reachable from every field screen. */
export function Switches() {
  const { t, language, setLanguage } = useWords();
  const theme = useTheme();
  return (
    <div className="grid gap-2">
      <ChoiceRow
        legend={t('field.theme')}
        options={themes}
        chosen={theme}
        words={(option) => t(`field.theme.${option}`)}
        onChoose={setTheme}
      />
      <ChoiceRow
        legend={t('field.language')}
        options={languages.options}
        chosen={language}
        words={(option) => ({ en: 'English', es: 'Español' })[option]}
        onChoose={setLanguage}
      />
    </div>
  );
}

import { useWords } from './words';

/** The other language, named in itself. */
export function LanguageSwitch({ className = '' }: { className?: string }) {
  const { language, setLanguage } = useWords();
  const other = language === 'en' ? 'es' : 'en';
  return (
    <button type="button" lang={other} onClick={() => setLanguage(other)} className={className}>
      {other === 'es' ? 'Español' : 'English'}
    </button>
  );
}

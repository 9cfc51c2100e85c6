import { useEffect, type ReactNode } from 'react';
import { LanguageSwitch } from '../LanguageSwitch';
import { ThemeSwitch } from '../ThemeSwitch';
import { useWords } from '../words';
import { TitleBlock, type TitleCell } from './TitleBlock';

interface SheetPageProps {
  title: string;
  /** True where the open tab already names the page: the title is read aloud but not drawn. */
  titleHidden?: boolean;
  /** Cells of the title block before "Coldloop". */
  cells?: readonly TitleCell[];
  /** Which page of how many, as the last cell of the title block. */
  page?: string;
  /** When the data on the sheet was fetched. */
  asOf?: number | undefined;
  actions?: ReactNode;
  children: ReactNode;
}

const switchClass = 'min-h-11 cursor-pointer px-2 underline underline-offset-4 hover:decoration-2';

function AsOf({ at }: { at: number }) {
  const { t, language } = useWords();
  const time = new Date(at).toLocaleTimeString(language === 'en' ? 'en-GB' : 'es-ES');
  return <span>{t('app.asOf', { time })}</span>;
}

/** One sheet: the title, the work area, and the strip with "as of" at the left and the title block at the right. */
export function SheetPage({ title, titleHidden, cells, page, asOf, actions, children }: SheetPageProps) {
  const { t } = useWords();
  useEffect(() => {
    document.title = `${title} · Coldloop`;
  }, [title]);
  const block = [
    ...(cells ?? [{ label: t('app.sheet'), value: title }]),
    { label: 'Coldloop', value: page ?? t('app.pageOf', { page: 1, pages: 1 }) },
  ];
  return (
    <>
      <main
        id="main"
        tabIndex={-1}
        className="flex-1 px-4 py-5 outline-none md:px-6 [&_a:not([class*=rounded])]:underline [&_a]:underline-offset-4"
      >
        <div className={titleHidden ? 'float-right ml-4' : 'mb-4 flex flex-wrap items-center gap-3'}>
          <h1 className={titleHidden ? 'sr-only' : 'm-0 text-2xl font-bold'}>{title}</h1>
          {actions && <div className="ml-auto flex flex-wrap gap-3">{actions}</div>}
        </div>
        {children}
      </main>
      <footer className="flex border-t-2 border-ink max-md:flex-col md:items-stretch">
        <div className="flex flex-1 flex-wrap items-center gap-x-3 px-3.5 text-sm">
          {asOf ? <AsOf at={asOf} /> : null}
          <LanguageSwitch className={switchClass} />
          <ThemeSwitch className={switchClass} />
        </div>
        <TitleBlock cells={block} />
      </footer>
    </>
  );
}

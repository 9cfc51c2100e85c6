import { Button } from './Button';
import { useWords } from './words';

interface MoreButtonProps {
  query: { hasNextPage: boolean; isFetchingNextPage: boolean; fetchNextPage: () => unknown };
}

/** Fetches the next page of a list, when there is one. */
export function MoreButton({ query }: MoreButtonProps) {
  const { t } = useWords();
  if (!query.hasNextPage) return null;
  return (
    <Button className="mt-4" busy={query.isFetchingNextPage} onClick={() => void query.fetchNextPage()}>
      {t('app.more')}
    </Button>
  );
}

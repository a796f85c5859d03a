import { Button } from './button.tsx';

interface ShowEarlierProps {
  /** The list's pages, as its query gives them. */
  pages: {
    hasNextPage: boolean;
    isFetchingNextPage: boolean;
    fetchNextPage: () => Promise<unknown>;
  };
  /** "lots" */
  what: string;
}

/** Under a list that is read page by page; nothing once all of it is there. */
export function ShowEarlier({ pages, what }: ShowEarlierProps) {
  if (!pages.hasNextPage) return null;
  return (
    <div className="mt-4 text-center">
      <Button busy={pages.isFetchingNextPage} onClick={() => void pages.fetchNextPage()}>
        Show earlier {what}
      </Button>
    </div>
  );
}

interface TableFootProps {
  shown: number;
  /** The paged query behind the table. */
  list: {
    hasNextPage: boolean;
    isFetchingNextPage: boolean;
    fetchNextPage: () => Promise<unknown>;
  };
}

export function TableFoot({ shown, list }: TableFootProps) {
  return (
    <p className="table-foot">
      {shown} shown.{' '}
      {list.hasNextPage && (
        <button
          type="button"
          className="text-button"
          disabled={list.isFetchingNextPage}
          onClick={() => void list.fetchNextPage()}
        >
          {list.isFetchingNextPage ? 'Fetching' : 'Show more'}
        </button>
      )}
    </p>
  );
}

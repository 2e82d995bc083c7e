import { Button } from '@radix-ui/themes';
import { Link } from 'react-router-dom';

/** What was drawn, and how to have it drawn anew. */
export interface Drawn {
  left: number;
  /** All the steps there are. */
  all: number;
  hasFigures: boolean;
  onAgain: () => void;
}

interface NextFiguresProps extends Drawn {
  /** For one step more: it went well, or nothing was asked. */
  isReady: boolean;
}

/** What comes next: the same again, one step more, all of it. */
export function NextFigures({ left, all, hasFigures, onAgain, isReady }: NextFiguresProps) {
  const hasMore = left < all;
  const goesOn = hasMore && isReady;
  return (
    <>
      {left < all - 1 && (
        <Button size="3" variant="outline" asChild>
          <Link to="?" replace>
            The whole
          </Link>
        </Button>
      )}
      {(hasFigures || left > 0) && (
        <Button size="3" variant={goesOn ? 'outline' : 'solid'} onClick={onAgain}>
          {sayAgain(left, hasFigures)}
        </Button>
      )}
      {hasMore && (
        <Button size="3" variant={goesOn ? 'solid' : 'outline'} asChild>
          <Link to={left + 1 === all ? '?' : `?left=${left + 1}`} replace>
            {left === 0 ? 'Do the last step' : 'One more step'}
          </Link>
        </Button>
      )}
    </>
  );
}

function sayAgain(left: number, hasFigures: boolean): string {
  if (!hasFigures) return 'Again';
  return left === 0 ? 'See other figures' : 'Again with fresh figures';
}

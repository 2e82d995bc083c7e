import '../features/sittings/sittings.css';
import { useMutation, useQueryClient, useSuspenseQuery } from '@tanstack/react-query';
import { useState } from 'react';
import { Outlet, type ShouldRevalidateFunctionArgs, useParams } from 'react-router-dom';
import { cacheOf, type LoaderArgs, requireSession } from '../api/session.ts';
import { HandedIn } from '../features/sittings/handed-in.tsx';
import {
  setPennant,
  sittingQuery,
  type SittingView,
  takeOver,
} from '../features/sittings/queries.ts';
import { standingsOf } from '../features/sittings/question-terminals.tsx';
import { type SittingDesk } from '../features/sittings/sitting-desk.ts';
import { useAnswerDesk } from '../features/sittings/use-answer-desk.ts';
import { useDeadline } from '../features/sittings/use-deadline.ts';

export async function loader(args: LoaderArgs) {
  await requireSession(args);
  return cacheOf(args).fetchQuery({ ...sittingQuery(args.params.id ?? ''), staleTime: 0 });
}

/** From question to question the desk holds what is newest; it is read again for another sitting. */
export function shouldRevalidate({ currentParams, nextParams }: ShouldRevalidateFunctionArgs) {
  return currentParams.id !== nextParams.id;
}

export function Component() {
  const { id = '' } = useParams();
  const cache = useQueryClient();
  const { data: sitting } = useSuspenseQuery(sittingQuery(id));
  // A take-over brings a new reading of the paper, and with it a new desk.
  const [takeOvers, setTakeOvers] = useState(0);
  const taking = useMutation({
    mutationFn: () => takeOver(id),
    onSuccess: (taken) => {
      cache.setQueryData(sittingQuery(id).queryKey, taken);
      setTakeOvers((count) => count + 1);
    },
  });
  if (sitting.state === 'handed-in') return <HandedIn sittingId={id} />;
  return (
    <OpenSitting
      key={`${id} ${takeOvers}`}
      sitting={sitting}
      takeOver={() => taking.mutate()}
      isTakingOver={taking.isPending}
    />
  );
}

interface OpenSittingProps {
  sitting: SittingView;
  takeOver: () => void;
  isTakingOver: boolean;
}

function OpenSitting({ sitting, ...taking }: OpenSittingProps) {
  const { desk, state } = useAnswerDesk(sitting);
  const isOver = useDeadline(sitting, desk);
  const [pennants, setPennants] = useState(() =>
    Object.fromEntries(sitting.items.map(({ key, comeBack }) => [key, comeBack])),
  );
  const marking = useMutation({
    mutationFn: ({ key, comeBack }: { key: string; comeBack: boolean }) =>
      setPennant(sitting.id, key, comeBack),
    retry: 3,
  });
  if (state.stopped === 'closed') return <HandedIn sittingId={sitting.id} />;
  const shared: SittingDesk = {
    ...{ sitting, desk, state, pennants, isOver },
    ...taking,
    standings: standingsOf(sitting.items, state),
    setPennant: (key, comeBack) => {
      setPennants((before) => ({ ...before, [key]: comeBack }));
      marking.mutate({ key, comeBack });
    },
  };
  return <Outlet context={shared} />;
}

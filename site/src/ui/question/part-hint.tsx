import { useMutation } from '@tanstack/react-query';
import { useState } from 'react';
import { Line } from '../line.tsx';
import { ProblemCallout } from '../problem-callout.tsx';
import { askHint } from './practice.ts';

interface PartHintProps {
  practiceId: string;
  part: string;
}

/** The formula a part begins with, for who asks; the marked question says that it was asked. */
export function PartHint({ practiceId, part }: PartHintProps) {
  const [isOpen, setIsOpen] = useState(false);
  const hint = useMutation({ mutationFn: () => askHint(practiceId, part) });
  const turn = () => {
    setIsOpen(!isOpen);
    if (!isOpen && !hint.data) hint.mutate();
  };
  return (
    <div className="part-hint not-printed">
      <button type="button" className="text-button" aria-expanded={isOpen} onClick={turn}>
        Hint for ({part})
      </button>
      <div role="status">
        {isOpen && hint.data && (
          <p>
            {hint.data.line ? (
              <Line tokens={hint.data.line} />
            ) : (
              'No formula leads here: read it off what is given.'
            )}
          </p>
        )}
      </div>
      {isOpen && <ProblemCallout error={hint.error} />}
    </div>
  );
}

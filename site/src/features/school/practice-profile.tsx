import { Button } from '@radix-ui/themes';
import { queryOptions, useMutation, useQuery, useQueryClient } from '@tanstack/react-query';
import { useState } from 'react';
import { answerOf, api } from '../../api/client.ts';
import { isProblem } from '../../api/problem.ts';
import { type Answer } from '../../api/views.ts';
import { ChoiceRows } from '../../ui/choice-row.tsx';
import { ProblemCallout } from '../../ui/problem-callout.tsx';
import { FailedState, RuledLines } from '../../ui/states.tsx';
import './school.css';

type Profile = Answer<'School_profile'>['profile'];

const profileQuery = queryOptions({
  queryKey: ['school', 'practice-profile'],
  queryFn: ({ signal }) => answerOf(api.GET('/api/school/practice-profile', { signal })),
});

const profiles: { id: Profile; name: string; hint: string }[] = [
  {
    id: 'metric',
    name: 'Metric practice',
    hint: 'Cable in mm², ambient correction by formula.',
  },
  {
    id: 'awg',
    name: 'AWG practice',
    hint: 'Cable by gauge number, ambient correction by table.',
  },
];

/** By which sizes and limits the school works, where practice differs between places. */
export function PracticeProfile() {
  const profile = useQuery(profileQuery);
  return (
    <section className="section practice-profile" aria-labelledby="practice-profile-title">
      <div>
        <h2 id="practice-profile-title">Practice profile of the school</h2>
        <p>
          Sizes, limits and factors differ between places. Every question states the profile it is
          asked under; this is the one your school starts from. What has been drawn or handed in
          stays as it was.
        </p>
        <p className="fine">
          A profile is a way of working, not the law: the local code decides everywhere.
        </p>
      </div>
      {profile.isPending && <RuledLines what="the practice profile" />}
      {profile.isError && <NoProfile error={profile.error} retry={() => void profile.refetch()} />}
      {profile.data && <ChooseProfile key={profile.data.profile} kept={profile.data.profile} />}
    </section>
  );
}

function NoProfile({ error, retry }: { error: unknown; retry: () => void }) {
  if (!isProblem(error, 'not-found')) return <FailedState error={error} retry={retry} />;
  return <p className="muted">The school itself is not entered yet, so it has no profile.</p>;
}

function ChooseProfile({ kept }: { kept: Profile }) {
  const [chosen, setChosen] = useState(kept);
  const queryClient = useQueryClient();
  const choose = useMutation({
    mutationFn: (profile: Profile) =>
      answerOf(api.PUT('/api/school/practice-profile', { body: { profile } })),
    onSuccess: (now) => queryClient.setQueryData(profileQuery.queryKey, now),
  });
  return (
    <div>
      <ChoiceRows
        name="practice-profile"
        legend="Practice profile"
        hideLegend
        disabled={choose.isPending}
        chosen={chosen}
        choices={profiles.map(({ id, name, hint }) => ({
          id,
          label: (
            <>
              {name}
              <small>{hint}</small>
            </>
          ),
        }))}
        onChoose={(id) => setChosen(id === 'awg' ? 'awg' : 'metric')}
      />
      <ProblemCallout error={choose.error} />
      <div className="actions">
        <Button
          size="3"
          variant="outline"
          disabled={chosen === kept || choose.isPending}
          onClick={() => choose.mutate(chosen)}
        >
          {choose.isPending ? 'Choosing' : 'Choose this profile'}
        </Button>
        <small role="status">
          {chosen === kept ? `The school works by ${nameOf(kept)}.` : 'Not chosen yet.'}
        </small>
      </div>
    </div>
  );
}

const nameOf = (profile: Profile) =>
  profiles.find(({ id }) => id === profile)?.name.replace(/^M/, 'm') ?? profile;

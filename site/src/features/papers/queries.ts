import { queryOptions } from '@tanstack/react-query';
import { answerOf, api } from '../../api/client.ts';
import { type Answer } from '../../api/views.ts';

export type PaperView = Answer<'Papers_paper'>;

export const paperQuery = (slug: string) =>
  queryOptions({
    queryKey: ['papers', slug],
    queryFn: ({ signal }) =>
      answerOf(api.GET('/api/papers/{slug}', { params: { path: { slug } }, signal })),
    staleTime: 0,
  });

interface StartSitting {
  paper: PaperView;
  givenName: string;
  familyName: string;
}

export const startSitting = ({ paper, givenName, familyName }: StartSitting) =>
  answerOf(
    api.POST('/api/sittings', {
      body: {
        ...{ givenName, familyName },
        paper: paper.slug,
        agreed: true,
        agreementHash: paper.agreementHash,
      },
    }),
  );

import { infiniteQueryOptions, useMutation, useQueryClient } from '@tanstack/react-query';
import { answerOf, api } from '../../api/client.ts';

export const certificatesQuery = (find: string) =>
  infiniteQueryOptions({
    queryKey: ['certificates', 'list', find],
    queryFn: ({ pageParam, signal }) =>
      answerOf(
        api.GET('/api/certificates', {
          params: { query: { ...(find && { find }), ...(pageParam && { cursor: pageParam }) } },
          signal,
        }),
      ),
    initialPageParam: '',
    getNextPageParam: (page) => page.nextCursor,
  });

/** Acts on one certificate; every list of certificates is fetched again after each. */
function useCertificateAct<Input, Result>(act: (input: Input) => Promise<Result>) {
  const queryClient = useQueryClient();
  return useMutation({
    mutationFn: act,
    onSuccess: () => queryClient.invalidateQueries({ queryKey: ['certificates'] }),
  });
}

export function useWithdraw(id: string) {
  return useCertificateAct((body: { reason: string }) =>
    answerOf(api.POST('/api/certificates/{id}/withdrawal', { params: { path: { id } }, body })),
  );
}

export function useCorrectName(id: string) {
  return useCertificateAct((body: { givenName: string; familyName: string; reason: string }) =>
    answerOf(
      api.POST('/api/certificates/{id}/name-correction', { params: { path: { id } }, body }),
    ),
  );
}

import { useMutation, useQueryClient } from '@tanstack/react-query';
import { answerOf, api } from '../../api/client.ts';
import { type Role } from '../../api/views.ts';

/** Acts of an administrator on one person; lists and panel are fetched again after each. */
function usePersonAct<Input>(act: (input: Input) => Promise<unknown>) {
  const queryClient = useQueryClient();
  return useMutation({
    mutationFn: act,
    onSettled: () => queryClient.invalidateQueries({ queryKey: ['people'] }),
  });
}

export function useSetRole(id: string) {
  return usePersonAct(({ role, given }: { role: Role; given: boolean }) => {
    const at = { params: { path: { id, role } } };
    return given
      ? answerOf(api.PUT('/api/people/{id}/roles/{role}', at))
      : answerOf(api.DELETE('/api/people/{id}/roles/{role}', at));
  });
}

export function useSuspend(id: string) {
  return usePersonAct((reason: string) =>
    answerOf(
      api.PUT('/api/people/{id}/suspension', { params: { path: { id } }, body: { reason } }),
    ),
  );
}

export function useReinstate(id: string) {
  return usePersonAct(() =>
    answerOf(api.DELETE('/api/people/{id}/suspension', { params: { path: { id } } })),
  );
}

export function useEndSessions(id: string) {
  return usePersonAct(() =>
    answerOf(api.DELETE('/api/people/{id}/sessions', { params: { path: { id } } })),
  );
}

export function useStartReset(id: string) {
  return usePersonAct(() =>
    answerOf(api.POST('/api/people/{id}/password-reset', { params: { path: { id } } })),
  );
}

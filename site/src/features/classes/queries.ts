import { queryOptions } from '@tanstack/react-query';
import { answerOf, api } from '../../api/client.ts';
import { type Answer } from '../../api/views.ts';

export type ListedClass = Answer<'Classes_list'>['classes'][number];
export type ClassView = Answer<'ClassView_view'>;
export type MemberView = ClassView['members'][number];

export const classesQuery = queryOptions({
  queryKey: ['classes'],
  queryFn: ({ signal }) => answerOf(api.GET('/api/classes', { signal })),
});

interface NewClass {
  name: string;
  startsOn: string;
  endsOn: string;
  trainers: string[];
}

export const openClass = (body: NewClass) => answerOf(api.POST('/api/classes', { body }));

export const classQuery = (id: string) =>
  queryOptions({
    queryKey: ['class', id],
    queryFn: ({ signal }) =>
      answerOf(api.GET('/api/classes/{id}', { params: { path: { id } }, signal })),
  });

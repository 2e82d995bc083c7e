import { queryOptions } from '@tanstack/react-query';
import { answerOf, api } from '../../api/client.ts';
import { type Answer } from '../../api/views.ts';

export type CourseMapView = Answer<'Courses_course'>;
export type UnitView = CourseMapView['units'][number];
export type SheetView = UnitView['sheets'][number];
export type WorksheetOfUnit = NonNullable<UnitView['worksheet']>;
export type PaperView = NonNullable<CourseMapView['paper']>;

/** The course with one's own way through it. */
export const courseQuery = queryOptions({
  queryKey: ['course'],
  queryFn: ({ signal }) => answerOf(api.GET('/api/course', { signal })),
});

export function joinClass(joinCode: string) {
  return answerOf(api.POST('/api/class-memberships', { body: { joinCode } }));
}

import { Injectable } from '@nestjs/common';
import type { SignedInAccount } from '../accounts/account.ts';
import { Clock } from '../clock/clock.ts';
import { NotFound } from '../problems/common.errors.ts';
import type { CompiledCourse } from '../publishing/compiled-course.ts';
import { memberRow } from './class-member-row.ts';
import { ClassProgressService } from './class-progress.service.ts';
import { ClassSlipsService } from './class-slips.service.ts';
import type { ClassView } from './class-view.schemas.ts';
import { ClassesService } from './classes.service.ts';

@Injectable()
export class ClassViewService {
  constructor(
    private readonly classes: ClassesService,
    private readonly progress: ClassProgressService,
    private readonly slips: ClassSlipsService,
    private readonly clock: Clock,
  ) {}

  /** @throws {NotFound} for a class of somebody else. */
  async view(account: SignedInAccount, id: string): Promise<ClassView> {
    const found = await this.classes.trainedClass(account, id);
    const course = found && (await this.progress.course(found.record.courseSlug));
    if (!found || !course) throw new NotFound();
    const { name, school, joinCode, startsOn, endsOn } = found.record;
    const accountIds = found.members.map((member) => member.id);
    const progressOf = await this.progress.of(accountIds, course);
    const now = this.clock.now();
    return {
      ...{ id, name, school, joinCode, startsOn, endsOn },
      course: { number: course.number, title: course.title },
      trainers: [...found.trainers],
      units: unitHeads(course),
      members: found.members.map((member) => {
        const { records, paper } = progressOf(member.id);
        return memberRow(member, records, { paper, now });
      }),
      ...(await this.slips.of(accountIds)),
    };
  }
}

const unitHeads = (course: CompiledCourse): ClassView['units'] =>
  course.units.map(({ number, title, sheets, worksheet }) => ({
    ...{ number, title },
    sheets: sheets.length,
    worksheet: worksheet?.number ?? null,
  }));

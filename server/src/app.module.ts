import { Module, type DynamicModule } from '@nestjs/common';
import { CertificatesModule } from './certificates/certificates.module.ts';
import { ClassViewModule } from './classes/class-view.module.ts';
import { ClassesModule } from './classes/classes.module.ts';
import { AccountsModule } from './accounts/accounts.module.ts';
import { AuditModule } from './audit/audit.module.ts';
import { Clock, ClockModule } from './clock/clock.ts';
import { ConfigModule } from './config/config.module.ts';
import type { Config } from './config/config.schema.ts';
import { CoursesModule } from './courses/courses.module.ts';
import { DatabaseModule } from './database/database.module.ts';
import { GlossaryModule } from './glossary/glossary.module.ts';
import { HealthModule } from './health/health.module.ts';
import { JobsModule } from './jobs/jobs.module.ts';
import { LessonsModule } from './lessons/lessons.module.ts';
import { PracticeModule } from './practice/practice.module.ts';
import { MailModule } from './mail/mail.module.ts';
import { PeopleModule } from './people/people.module.ts';
import { RecordModule } from './record/record.module.ts';
import { RegisterModule } from './register/register.module.ts';
import { RemarkingModule } from './remarking/remarking.module.ts';
import { SchoolModule } from './school/school.module.ts';
import { SearchModule } from './search/search.module.ts';
import { SecondFactorsModule } from './second-factors/second-factors.module.ts';
import { SessionsModule } from './sessions/sessions.module.ts';
import { SignInModule } from './sessions/sign-in.module.ts';
import { SittingsModule } from './sittings/sittings.module.ts';
import { TablesModule } from './tables/tables.module.ts';
import { WorksheetsModule } from './worksheets/worksheets.module.ts';

/** The list of features, nothing else. */
@Module({})
export class AppModule {
  static with(config: Config, clock = new Clock()): DynamicModule {
    return {
      module: AppModule,
      imports: [
        ConfigModule.with(config),
        ClockModule.with(clock),
        DatabaseModule,
        JobsModule,
        CertificatesModule,
        AuditModule,
        MailModule,
        SessionsModule,
        AccountsModule,
        SecondFactorsModule,
        SignInModule,
        PeopleModule,
        RecordModule,
        RegisterModule,
        SchoolModule,
        SittingsModule,
        ClassesModule,
        ClassViewModule,
        CoursesModule,
        GlossaryModule,
        LessonsModule,
        PracticeModule,
        SearchModule,
        TablesModule,
        WorksheetsModule,
        RemarkingModule,
        HealthModule,
      ],
    };
  }
}

import { Global, Injectable, Module, type DynamicModule } from '@nestjs/common';

/** The time, injected so that tests can set it. */
@Injectable()
export class Clock {
  now(): Date {
    return new Date();
  }

  /**
   * The time where several servers must agree, such as at a deadline: the database's reading,
   * taken with the row it decides about.
   */
  agreed(databaseTime: Date): Date {
    return databaseTime;
  }
}

@Global()
@Module({})
export class ClockModule {
  static with(clock: Clock): DynamicModule {
    return {
      module: ClockModule,
      providers: [{ provide: Clock, useValue: clock }],
      exports: [Clock],
    };
  }
}

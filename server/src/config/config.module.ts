import { Global, Module, type DynamicModule } from '@nestjs/common';
import type { Config } from './config.schema.ts';

/** Injection token of the checked settings. */
export const CONFIG = Symbol('Config');

@Global()
@Module({})
export class ConfigModule {
  static with(config: Config): DynamicModule {
    return {
      module: ConfigModule,
      providers: [{ provide: CONFIG, useValue: config }],
      exports: [CONFIG],
    };
  }
}

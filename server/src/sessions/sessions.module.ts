import { Module } from '@nestjs/common';
import { APP_GUARD } from '@nestjs/core';
import { JwtModule } from '@nestjs/jwt';
import { PassportModule } from '@nestjs/passport';
import { SequelizeModule } from '@nestjs/sequelize';
import { CONFIG } from '../config/config.module.ts';
import type { Config } from '../config/config.schema.ts';
import { KnownDevicesService } from './known-devices.service.ts';
import { SessionModel } from './models/session.model.ts';
import { SessionGuard } from './session.guard.ts';
import { SessionStrategy } from './session.strategy.ts';
import { SessionsRepository } from './sessions.repository.ts';
import { SessionsService } from './sessions.service.ts';

/** Sessions and the guard that asks for them. Signing in is a module of its own, above accounts. */
@Module({
  imports: [
    PassportModule,
    JwtModule.registerAsync({
      inject: [CONFIG],
      useFactory: (config: Config) => ({
        secret: config.SESSION_SECRET,
        signOptions: { algorithm: 'HS256' },
      }),
    }),
    SequelizeModule.forFeature([SessionModel]),
  ],
  providers: [
    KnownDevicesService,
    SessionsService,
    SessionsRepository,
    SessionStrategy,
    { provide: APP_GUARD, useClass: SessionGuard },
  ],
  exports: [KnownDevicesService, SessionsService],
})
export class SessionsModule {}

import { Injectable } from '@nestjs/common';
import { JwtService } from '@nestjs/jwt';
import { randomBytes } from 'node:crypto';

const AUDIENCE = 'ferrule-device';
export const DEVICE_MEMORY_DAYS = 180;

interface DeviceToken {
  readonly sub: string;
  readonly device: string;
}

/**
 * Devices from which an account was opened before. Their tries are counted apart, so that
 * strangers who guess cannot shut the owner out. The token opens nothing by itself.
 */
@Injectable()
export class KnownDevicesService {
  constructor(private readonly jwt: JwtService) {}

  /** Which of the account's devices this is, or null for a new one. */
  async recognise(token: string | null, accountId: string | undefined): Promise<string | null> {
    if (token === null || accountId === undefined) return null;
    try {
      const known = await this.jwt.verifyAsync<DeviceToken>(token, {
        audience: AUDIENCE,
        algorithms: ['HS256'],
      });
      return known.sub === accountId ? known.device : null;
    } catch {
      return null;
    }
  }

  remember(accountId: string, device: string | null): Promise<string> {
    const token: DeviceToken = {
      sub: accountId,
      device: device ?? randomBytes(16).toString('base64url'),
    };
    return this.jwt.signAsync(
      { ...token },
      {
        audience: AUDIENCE,
        expiresIn: `${DEVICE_MEMORY_DAYS}d`,
      },
    );
  }
}

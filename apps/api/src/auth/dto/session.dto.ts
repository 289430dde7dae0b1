import { ApiProperty } from '@nestjs/swagger';
import type { SessionDto as SessionShape } from '@lampwright/contracts';
import type { Session } from '../session.entity';

/** A device that is signed in. */
export class SessionDto implements SessionShape {
  @ApiProperty()
  id: string;

  @ApiProperty()
  deviceName: string;

  @ApiProperty({ format: 'date-time' })
  createdAt: string;

  @ApiProperty({ format: 'date-time' })
  lastUsedAt: string;

  @ApiProperty({ description: 'True for the device that asks.' })
  current: boolean;
}

export function toSessionDto(session: Session, currentId: string): SessionDto {
  return {
    id: session.id,
    deviceName: session.deviceName,
    createdAt: session.createdAt.toISOString(),
    lastUsedAt: session.lastUsedAt.toISOString(),
    current: session.id === currentId,
  };
}

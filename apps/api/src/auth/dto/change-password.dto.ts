import { ApiProperty } from '@nestjs/swagger';
import type { ChangePasswordRequest } from '@lampwright/contracts';
import { IsString, MaxLength, MinLength } from 'class-validator';

/** Body of a change of one's own password. */
export class ChangePasswordDto implements ChangePasswordRequest {
  @ApiProperty({ maxLength: 200 })
  @IsString()
  @MinLength(1)
  @MaxLength(200)
  current: string;

  @ApiProperty({ minLength: 10, maxLength: 200 })
  @IsString()
  @MinLength(10)
  @MaxLength(200)
  next: string;
}

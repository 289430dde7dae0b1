import { ApiProperty, ApiPropertyOptional } from '@nestjs/swagger';
import type { SignInRequest } from '@lampwright/contracts';
import { IsEmail, IsOptional, IsString, MaxLength, MinLength } from 'class-validator';

/** Body of a sign-in. */
export class SignInDto implements SignInRequest {
  @ApiProperty({ example: 'lead@yard.example' })
  @IsEmail()
  @MaxLength(254)
  email: string;

  @ApiProperty({ maxLength: 200 })
  @IsString()
  @MinLength(1)
  @MaxLength(200)
  password: string;

  @ApiPropertyOptional({ maxLength: 100, example: 'Tablet 4' })
  @IsOptional()
  @IsString()
  @MaxLength(100)
  deviceName?: string;
}

import { ApiProperty, ApiPropertyOptional } from '@nestjs/swagger';
import {
  ROLES,
  type CreatePersonRequest,
  type Role,
  type UpdatePersonRequest,
} from '@lampwright/contracts';
import { IsEmail, IsIn, IsOptional, IsString, MaxLength, MinLength } from 'class-validator';

/** Body of a new account. */
export class CreatePersonDto implements CreatePersonRequest {
  @ApiProperty({ minLength: 1, maxLength: 100 })
  @IsString()
  @MinLength(1)
  @MaxLength(100)
  name: string;

  @ApiProperty({ maxLength: 254 })
  @IsEmail()
  @MaxLength(254)
  email: string;

  @ApiProperty({ enum: ROLES, enumName: 'Role' })
  @IsIn(ROLES)
  role: Role;

  @ApiProperty({ minLength: 10, maxLength: 200 })
  @IsString()
  @MinLength(10)
  @MaxLength(200)
  password: string;
}

/** Body of a change to an account; what is left out stays. */
export class UpdatePersonDto implements UpdatePersonRequest {
  @ApiPropertyOptional({ minLength: 1, maxLength: 100 })
  @IsOptional()
  @IsString()
  @MinLength(1)
  @MaxLength(100)
  name?: string;

  @ApiPropertyOptional({ enum: ROLES, enumName: 'Role' })
  @IsOptional()
  @IsIn(ROLES)
  role?: Role;
}

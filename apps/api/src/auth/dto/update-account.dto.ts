import { ApiPropertyOptional } from '@nestjs/swagger';
import type { Preferences, UpdateAccountRequest } from '@lampwright/contracts';
import { Type } from 'class-transformer';
import { IsIn, IsOptional, IsString, MaxLength, MinLength, ValidateNested } from 'class-validator';

const LENGTHS = ['feet', 'metres'] as const satisfies Preferences['lengths'][];
const THEMES = ['light', 'dark', 'system'] as const satisfies Preferences['theme'][];

/** Preferences to change; what is left out stays. */
export class PreferencesDto implements Partial<Preferences> {
  @ApiPropertyOptional({ enum: LENGTHS })
  @IsOptional()
  @IsIn(LENGTHS)
  lengths?: Preferences['lengths'];

  @ApiPropertyOptional({ enum: THEMES })
  @IsOptional()
  @IsIn(THEMES)
  theme?: Preferences['theme'];
}

/** Body of a change to one's own account. */
export class UpdateAccountDto implements UpdateAccountRequest {
  @ApiPropertyOptional({ minLength: 1, maxLength: 100 })
  @IsOptional()
  @IsString()
  @MinLength(1)
  @MaxLength(100)
  name?: string;

  @ApiPropertyOptional({ type: PreferencesDto })
  @IsOptional()
  @ValidateNested()
  @Type(() => PreferencesDto)
  preferences?: PreferencesDto;
}

import type { Type } from '@nestjs/common';
import { ApiProperty } from '@nestjs/swagger';
import type { Page } from '@lampwright/contracts';

/** The class that describes a page of `item` in the OpenAPI document. */
export function pageOf<T>(item: Type<T>, name: string): Type<Page<T>> {
  class PageDto implements Page<T> {
    @ApiProperty({ type: [item] })
    items: T[];

    @ApiProperty({ type: 'integer', description: 'Number of items on all pages.' })
    total: number;

    @ApiProperty({ type: 'integer' })
    page: number;

    @ApiProperty({ type: 'integer' })
    size: number;
  }
  Object.defineProperty(PageDto, 'name', { value: name });
  return PageDto;
}

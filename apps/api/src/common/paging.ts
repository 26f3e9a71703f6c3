import { ApiProperty, ApiPropertyOptional } from '@nestjs/swagger';
import { Type } from 'class-transformer';
import { IsInt, IsOptional, Max, Min } from 'class-validator';

/** Which page of a list is wanted. Pages count from 1. */
export class PageQuery {
  @ApiPropertyOptional({ minimum: 1, default: 1 })
  @IsOptional()
  @Type(() => Number)
  @IsInt()
  @Min(1)
  page: number = 1;

  @ApiPropertyOptional({ minimum: 1, maximum: 200, default: 50 })
  @IsOptional()
  @Type(() => Number)
  @IsInt()
  @Min(1)
  @Max(200)
  pageSize: number = 50;
}

/** One page of a list, with how many there are altogether. */
export class Page<T> {
  items!: T[];
  @ApiProperty()
  total!: number;
  @ApiProperty()
  page!: number;
  @ApiProperty()
  pageSize!: number;
}

/** How many rows come before the wanted page. */
export function offsetOf(query: PageQuery): number {
  return (query.page - 1) * query.pageSize;
}

/** A page's type for one item type, so that the API description names it: `class NoticePage extends pageOf(NoticeRow) {}`. */
export function pageOf<T>(item: new () => T): new () => Page<T> {
  class PageOfItems extends Page<T> {
    @ApiProperty({ type: () => [item] })
    declare items: T[];
  }
  return PageOfItems;
}

/** Query of every list route. `page` counts from 1. */
export interface PageQuery {
  page?: number;
  /** 1 to 100; 25 by default. */
  size?: number;
  search?: string;
  /** A field name, with a leading `-` for descending. */
  sort?: string;
}

export interface Page<T> {
  items: T[];
  total: number;
  page: number;
  size: number;
}

import type { ReactNode } from 'react';

export interface Column<Row> {
  id: string;
  header: string;
  /** what to sort by; null sorts last either way */ value: (row: Row) => string | number | null;
  /** what to show, when it is not the value itself */ cell?: (row: Row) => ReactNode;
  /** numbers stand to the right in the mono face */ isNumber?: boolean;
}

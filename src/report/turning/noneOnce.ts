/** A figure that cannot be had for the reason a figure above it gives says nothing new: it is left out. */
import type { Row } from '../row.ts';

export const noneOnce = <E extends { readonly row: Row }>(entries: readonly E[]): E[] =>
  entries.filter(
    ({ row }, i) =>
      row.value !== null ||
      !entries.slice(0, i).some(({ row: before }) => before.value === null && before.why === row.why),
  );

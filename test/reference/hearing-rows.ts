import { exposureRows } from "./hearing/exposure.ts";
import { permittedTimeRows } from "./hearing/permitted-times.ts";
import { physicsRows } from "./hearing/physics.ts";
import { protectorRows } from "./hearing/protectors.ts";
import { zoneRows } from "./hearing/zones.ts";
import type { RowGroup } from "./row.ts";

/** Every row of hearing-check-values.json. */
export const hearingRows: readonly RowGroup[] = [
  ...exposureRows,
  ...permittedTimeRows,
  ...protectorRows,
  ...zoneRows,
  ...physicsRows,
];

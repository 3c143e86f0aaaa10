import type { JunctionDefinition } from './definition';
import { conicalTakeOffs } from './junctions-conical';
import { severalLegs } from './junctions-several';
import { tees } from './junctions-tees';

/** Places where a row joins another. */
export const junctions: readonly JunctionDefinition[] = [...tees, ...conicalTakeOffs, ...severalLegs];

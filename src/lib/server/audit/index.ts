/**
 * The trail of what was done to whom: append-only, each entry with the hash of the one before. It holds ids
 * and words of closed sets; who has a name today is asked elsewhere, so that it stays true when a name goes.
 */
export { record, type Deed } from './record';
export { ownTrail, trail, type TrailEntry, type TrailPage } from './trail';
export { verifyChain, type Verdict } from './verify';

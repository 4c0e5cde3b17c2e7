/**
 * Version of the engine's choices and numerics, stored with every result: the middle number rises when results move
 * by choice or by a new effect, the last when a fault is mended, the first when old results can no longer be
 * compared. `lib/method/changes.ts` says what moves and by how much.
 */
export const ENGINE_VERSION = '0.2.1';

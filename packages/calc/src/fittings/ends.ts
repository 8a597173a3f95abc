/** Losses where the duct meets a room or a plenum, on the velocity pressure of the duct. */

/**
 * Air that leaves an open duct end loses all its velocity pressure. Exact for an even profile.
 */
export const OPEN_EXIT_COEFFICIENT = 1;

/**
 * Air that enters a plain, sharp duct end standing free in a room.
 *
 * Source   Idelchik (1986), diagram 3-1, thin wall, projecting half a diameter or more; a flush end has 0.5
 */
export const OPEN_ENTRY_COEFFICIENT = 1;

/** Air that enters a duct end flush with the wall of a plenum. Source: Idelchik (1986), diagram 3-1. */
export const FLUSH_ENTRY_COEFFICIENT = 0.5;

export const ENDS_SOURCE = "Idelchik (1986), diagram 3-1; an exit loses one velocity pressure";

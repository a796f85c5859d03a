import { TheHouse } from './migration-20261201-the-house.ts';

/** In the order in which they run; a test compares this list with the folder. */
export const migrations = [{ name: 'migration-20261201-the-house', class: TheHouse }];

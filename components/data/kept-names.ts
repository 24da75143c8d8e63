/** Name of the cache that holds whole files of bench copies, by their `/media` address. */
export const keptFilesCache = 'scantling-kept-files';

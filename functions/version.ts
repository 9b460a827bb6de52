/** Put in by the build; a run straight from the sources says so. */
declare const WALLFALL_VERSION: string;
declare const WALLFALL_BUILT: string;

export const version = typeof WALLFALL_VERSION === "string" ? WALLFALL_VERSION : "from source";
export const built = typeof WALLFALL_BUILT === "string" ? WALLFALL_BUILT : "not built";

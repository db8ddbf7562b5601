interface ZodSettings {
  __zod_globalConfig?: { jitless?: boolean };
}

// Zod probes for eval unless told not to, and our content security policy reports that. It takes its
// settings from here when it is first loaded: written without importing it, so that the first page,
// which parses nothing, need not fetch it. Imported before everything else.
const settings = globalThis as ZodSettings;
settings.__zod_globalConfig = { ...settings.__zod_globalConfig, jitless: true };

export {};

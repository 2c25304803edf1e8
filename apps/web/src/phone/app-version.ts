const told: unknown = import.meta.env?.['VITE_APP_VERSION'];

/** Version of the app as it stands in each entry and manifest; set by the build. */
export const appVersion = typeof told === 'string' ? told : '0.1.0';

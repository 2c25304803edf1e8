/** Version of the app as it stands in each entry and manifest; set by the build. */
export const appVersion: string = import.meta.env?.['VITE_APP_VERSION'] ?? '0.1.0';

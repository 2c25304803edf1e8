import { config } from 'zod/v4/core';

// Without this the library probes eval, which the content security policy refuses and reports.
config({ jitless: true });

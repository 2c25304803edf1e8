process.argv.push('--fast');
await import('./test.mjs');

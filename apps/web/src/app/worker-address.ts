/**
 * The address of the service worker, as Trusted Types want it. The one policy of the application allows this one script
 * and nothing else.
 */
export function workerAddress(): string {
  const address = '/sw.js';
  const types = (window as unknown as { trustedTypes?: TrustedTypeFactoryLike }).trustedTypes;
  if (!types) return address;
  policy ??= types.createPolicy('rimeward', {
    createScriptURL: (asked) => {
      if (asked !== address) throw new TypeError('Only the service worker is loaded this way');
      return asked;
    },
  });
  return policy.createScriptURL(address) as string;
}

interface TrustedTypeFactoryLike {
  createPolicy: (name: string, rules: { createScriptURL: (asked: string) => string }) => PolicyLike;
}
interface PolicyLike {
  createScriptURL: (asked: string) => unknown;
}
let policy: PolicyLike | null = null;

const en = {
  title: 'On this phone',
  nothing: 'Nothing waits on this phone. Everything is with the office.',
  waiting: '{{entries}} entries and {{photos}} photographs wait, {{size}}',
  since: 'Oldest since {{when}}',
  lastContact: 'Last contact with the office {{when}}',
  neverContact: 'No contact with the office yet',
  signInAgain: 'Sign in again',
  deliverNow: 'Deliver now',
  delivering: 'Delivering',
  exportAll: 'Save a copy of this phone’s log',
  standings: {
    'on-this-phone': 'saved on this phone',
    'on-its-way': 'on its way',
    'with-the-office': 'with the office',
    held: 'held: the office looks at it',
  },
  reasons: {
    'no-network': 'The office cannot be reached. It goes on by itself.',
    'captive-portal': 'This network asks for a sign-in of its own before it lets anything through.',
    'sign-in': 'Delivery goes on, but reading needs you to sign in again.',
    'server-busy': 'The office is busy. It goes on by itself.',
    'server-fault': 'The office has a fault. Nothing is lost, it goes on by itself.',
    'device-revoked': 'The office has withdrawn this phone. Save a copy and call the office.',
    fork: 'This phone was copied from another one. Save a copy and call the office.',
    unknown: 'It does not go on. Save a copy and call the office.',
  },
  photograph: 'Photograph',
  entry: 'Entry',
  storage: '{{used}} of {{quota}} used',
  notPersisted:
    'The browser may clear this phone’s storage when it runs full. Install the app on the home screen to prevent it.',
  persisted: 'This storage is kept by the browser.',
};
export type OnThisPhoneTexts = typeof en;
export default en;

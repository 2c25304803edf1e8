import { Outlet } from 'react-router-dom';
import { ConnectionLine } from '../../features/session/ConnectionLine';

/** Every phone screen stands under the line that says what is still on this phone. */
export function Component() {
  return (
    <>
      <ConnectionLine />
      <Outlet />
    </>
  );
}

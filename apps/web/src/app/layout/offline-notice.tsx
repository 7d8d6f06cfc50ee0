import { chakra } from '@chakra-ui/react';
import { useOnline } from '../../lib/use-online';

/** Says at the foot of the window that there is no network; what was typed stays on the page. */
export function OfflineNotice() {
  const online = useOnline();
  return (
    <chakra.div
      role="status"
      position="fixed"
      insetInline="0"
      bottom="0"
      zIndex="notice"
      pointerEvents="none"
    >
      {online ? null : (
        <chakra.p
          bg="ink"
          color="chalk"
          paddingBlock="3"
          paddingInline="4"
          textAlign="center"
          fontWeight="medium"
        >
          You are offline. You can read on; what you change is sent when you try again with a connection.
        </chakra.p>
      )}
    </chakra.div>
  );
}

import { chakra } from '@chakra-ui/react';
import { useNavigation } from 'react-router-dom';
import { VisuallyHidden } from '../../components/visually-hidden';

/** A thin line on top while the next page is fetched; it waits a moment, so that quick pages do not flicker. */
export function PendingBar() {
  const { state } = useNavigation();
  return (
    <chakra.div role="status" position="fixed" insetInline="0" top="0" zIndex="notice">
      {state === 'idle' ? null : (
        <chakra.div height="3px" bg="bracken" opacity="0" animation="breathe 1.2s ease-in-out 300ms infinite">
          <VisuallyHidden>Loading the page</VisuallyHidden>
        </chakra.div>
      )}
    </chakra.div>
  );
}

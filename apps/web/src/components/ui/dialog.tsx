import { Dialog as Parts, Portal } from '@chakra-ui/react';
import type { ReactNode } from 'react';

interface DialogProps {
  open: boolean;
  onClose: () => void;
  title: ReactNode;
  children: ReactNode;
  /** The buttons: what it is for first, the way back last. */
  footer: ReactNode;
  /** Before something public: announced as an alert, and not closed by a slip of the hand beside it. */
  grave?: boolean;
}

/** A question over the page. Focus stays within it and returns to where it was; Escape closes it. */
export function Dialog({ open, onClose, title, children, footer, grave = false }: DialogProps) {
  return (
    <Parts.Root
      open={open}
      onOpenChange={({ open: stays }) => !stays && onClose()}
      role={grave ? 'alertdialog' : 'dialog'}
      closeOnInteractOutside={!grave}
      placement="center"
      lazyMount
      unmountOnExit
    >
      <Portal>
        <Parts.Backdrop />
        <Parts.Positioner px="3">
          <Parts.Content bg="card" color="ink" fontSize="md" borderWidth="1px" borderColor="line">
            <Parts.Header px="5" pt="5" pb="2">
              <Parts.Title fontSize="lg">{title}</Parts.Title>
            </Parts.Header>
            <Parts.Body px="5" pb="4">
              {children}
            </Parts.Body>
            <Parts.Footer
              px="5"
              pb="5"
              flexWrap="wrap"
              justifyContent="flex-start"
              flexDirection="row-reverse"
            >
              {footer}
            </Parts.Footer>
          </Parts.Content>
        </Parts.Positioner>
      </Portal>
    </Parts.Root>
  );
}

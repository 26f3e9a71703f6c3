import { chakra, Spinner } from '@chakra-ui/react';
import type { ComponentProps } from 'react';
import { Link } from 'react-router-dom';
import { buttonRecipe } from './button-recipe';

const Base = chakra('button', buttonRecipe);
const LinkBase = chakra(Link, buttonRecipe);

interface ButtonProps extends ComponentProps<typeof Base> {
  /** The act is under way: the button waits, says so to screen readers, and cannot be pressed again. */
  busy?: boolean;
}

/**
 * A button. `kind`: *go* for the one thing the screen is for, *plain* for the others, *stop* for what forbids or ends,
 * *quiet* for what hardly needs a frame. While `busy` it is disabled, so that a double click does nothing twice.
 */
export function Button({ busy = false, disabled, children, type = 'button', ...rest }: ButtonProps) {
  return (
    <Base type={type} disabled={disabled || busy} aria-busy={busy || undefined} {...rest}>
      {busy && <Spinner size="sm" borderWidth="2px" aria-hidden />}
      {children}
    </Base>
  );
}

/** A link that looks like a button: for going somewhere, never for doing something. */
export const ButtonLink = LinkBase;

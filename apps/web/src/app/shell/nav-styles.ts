import type { Role } from '@halfpitch/contracts';
import type { SystemStyleObject } from '@chakra-ui/react';

const RAIL = '6.75rem';
const LIST = '15rem';

/** Whether a role, on a wide screen, gets the list with text or stays with the rail of large targets. */
export const hasSidebar = (role: Role): boolean => role === 'desk' || role === 'owner';

/** A bar at the foot on phones, a rail on tablets, and on wide screens a list with text for desk and owner. */
export function navStyles(role: Role): SystemStyleObject {
  return {
    position: { base: 'fixed', md: 'sticky' },
    insetInline: { base: 0, md: 'auto' },
    bottom: { base: 0, md: 'auto' },
    top: { md: 0 },
    zIndex: 'docked',
    display: 'flex',
    flexDirection: { base: 'row', md: 'column' },
    gap: { base: 0, md: 1 },
    height: { md: '100dvh' },
    overflowY: { md: 'auto' },
    width: { md: RAIL, lg: hasSidebar(role) ? LIST : RAIL },
    flexShrink: 0,
    px: { md: 2, lg: hasSidebar(role) ? 3 : 2 },
    py: { md: 4 },
    pb: { base: 'env(safe-area-inset-bottom)', md: 4 },
    bg: 'bg.panel',
    borderTopWidth: { base: '1px', md: 0 },
    borderInlineEndWidth: { md: '1px' },
  };
}

/** One target: icon over word, at least 56 px high; beside it in the list with text. */
export function targetStyles(role: Role): SystemStyleObject {
  return {
    display: 'flex',
    flex: { base: '1 1 0', md: '0 0 auto' },
    minWidth: 0,
    flexDirection: { base: 'column', lg: hasSidebar(role) ? 'row' : 'column' },
    alignItems: 'center',
    justifyContent: { base: 'center', lg: hasSidebar(role) ? 'flex-start' : 'center' },
    gap: { base: 1, lg: hasSidebar(role) ? 3 : 1 },
    minHeight: { base: '16', md: '4.5rem', lg: hasSidebar(role) ? '11' : '4.5rem' },
    px: { base: 1, lg: hasSidebar(role) ? 3 : 1 },
    borderRadius: { md: 'l2' },
    color: 'fg.muted',
    fontSize: { base: 'sm', lg: hasSidebar(role) ? 'md' : 'sm' },
    lineHeight: '1.15',
    textAlign: { base: 'center', lg: hasSidebar(role) ? 'start' : 'center' },
    cursor: 'pointer',
    _hover: { color: 'fg', bg: 'bg.muted' },
    _focusVisible: { outlineOffset: '-3px' },
    '&[aria-current=page]': {
      color: 'steel.fg',
      fontWeight: 'semibold',
      bg: { md: 'steel.subtle' },
      boxShadow: { base: 'inset 0 3px 0 var(--hp-colors-steel-solid)', md: 'none' },
    },
  };
}

/** Where a panel opens beside the rail or the list. */
export const besideNav = (role: Role): SystemStyleObject => ({
  bottom: 4,
  left: { md: `calc(${RAIL} + 0.5rem)`, lg: `calc(${hasSidebar(role) ? LIST : RAIL} + 0.5rem)` },
});

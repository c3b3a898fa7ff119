import { chakra } from '@chakra-ui/react';
import type { SystemStyleObject } from '@chakra-ui/react';
import type { LucideIcon } from 'lucide-react';
import { useId, useRef } from 'react';
import type { ReactNode } from 'react';

interface PopPanelProps {
  label: string;
  icon: LucideIcon;
  /** The look of the button that opens it. */
  buttonStyles: SystemStyleObject;
  /** Where the panel stands on the screen. */
  place: SystemStyleObject;
  children: ReactNode;
}

const Panel = chakra('div', {
  base: {
    position: 'fixed',
    inset: 'auto',
    minWidth: '16rem',
    maxWidth: 'calc(100vw - 1rem)',
    p: 2,
    bg: 'bg.panel',
    color: 'fg',
    borderWidth: '1px',
    borderColor: 'border.emphasized',
    borderRadius: 'l3',
    boxShadow: 'lg',
  },
});

/** A line in the panel that leads somewhere or does something. */
export const panelLine: SystemStyleObject = {
  display: 'flex',
  alignItems: 'center',
  gap: 3,
  width: 'full',
  minHeight: '11',
  px: 3,
  borderRadius: 'l2',
  textAlign: 'start',
  cursor: 'pointer',
  _hover: { bg: 'bg.muted' },
  '&[aria-current=page]': { color: 'steel.fg', fontWeight: 'semibold', bg: 'steel.subtle' },
};

/** A button and the small panel it opens, by the browser's own popover: Escape and a tap beside it close it. */
export function PopPanel({ label, icon: Icon, buttonStyles, place, children }: PopPanelProps) {
  const id = useId();
  const panel = useRef<HTMLDivElement>(null);
  return (
    <>
      <chakra.button type="button" popoverTarget={id} css={buttonStyles}>
        <Icon size={22} strokeWidth={1.75} aria-hidden="true" />
        <span>{label}</span>
      </chakra.button>
      <Panel
        ref={panel}
        id={id}
        popover="auto"
        css={place}
        onClick={(event) => {
          if (event.target instanceof Element && event.target.closest('a, [data-closes]'))
            panel.current?.hidePopover();
        }}
      >
        {children}
      </Panel>
    </>
  );
}

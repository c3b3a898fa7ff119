import { Box, chakra, HStack, Text } from '@chakra-ui/react';
import { useEffect, useRef } from 'react';
import { Outlet, ScrollRestoration, useLocation } from 'react-router-dom';
import { useSession } from '../session';
import { Brand } from './brand';
import { Nav } from './nav';

const SkipLink = chakra('a', {
  base: {
    position: 'fixed',
    insetStart: 3,
    top: 3,
    zIndex: 'skipNav',
    px: 4,
    py: 3,
    bg: 'steel.solid',
    color: 'steel.contrast',
    borderRadius: 'l2',
    fontWeight: 'semibold',
    transform: 'translateY(-200%)',
    _focus: { transform: 'none' },
  },
});

/** After a change of page the reader's place is its main part, as after loading a page. */
function useFocusOnNewPage() {
  const { pathname } = useLocation();
  const main = useRef<HTMLElement>(null);
  const last = useRef(pathname);
  useEffect(() => {
    if (last.current !== pathname) main.current?.focus({ preventScroll: true });
    last.current = pathname;
  }, [pathname]);
  return main;
}

/** The frame of every page behind the sign-in. */
export function Shell() {
  const { role, workshop } = useSession();
  const main = useFocusOnNewPage();
  return (
    <Box display={{ md: 'flex' }} minHeight="100dvh">
      <SkipLink href="#main" className="no-print">
        Skip to the page
      </SkipLink>
      <HStack as="header" hideFrom="md" justify="space-between" px="4" pt="3" className="no-print">
        <Brand />
        <Text color="fg.muted" textStyle="sm" truncate>
          {workshop.name}
        </Text>
      </HStack>
      <Nav />
      <Box
        as="main"
        id="main"
        ref={main}
        tabIndex={-1}
        outline="none"
        flex="1"
        minWidth="0"
        px={{ base: 4, md: 6, xl: 10 }}
        pt={{ base: 4, md: 8 }}
        pb={{ base: 28, md: 12 }}
        _print={{ p: 0 }}
      >
        <Box maxWidth={role === 'rider' ? '44rem' : '80rem'} mx={role === 'rider' ? 'auto' : undefined}>
          <Outlet />
        </Box>
      </Box>
      <ScrollRestoration />
    </Box>
  );
}

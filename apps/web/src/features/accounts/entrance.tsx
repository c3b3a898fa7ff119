import { Box, Flex, Text } from '@chakra-ui/react';
import { Outlet } from 'react-router-dom';
import { Brand } from '../../app/shell/brand';
import { LinkStrip } from '../../components/drawings/link-strip';

/** The frame of the pages before the sign-in: what the house is for, and one thing to do. */
export function Entrance() {
  return (
    <Flex as="main" minHeight="100dvh" direction="column" align="center" px="4" py={{ base: 6, md: 16 }}>
      <Box width="full" maxWidth="27rem">
        <Brand />
        <Box my={{ base: 5, md: 7 }}>
          <LinkStrip share={0.72} decorative />
        </Box>
        <Outlet />
        <Text mt="10" color="fg.muted" textStyle="sm">
          Halfpitch tells when each chain is due for wax or oil, when it must be replaced, and why.
        </Text>
      </Box>
    </Flex>
  );
}

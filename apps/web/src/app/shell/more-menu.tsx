import { Box, chakra, Menu, Portal } from '@chakra-ui/react';
import { Ellipsis } from 'lucide-react';
import { Link } from 'react-router-dom';
import { useSession } from '../session';
import type { NavItem } from './nav-items';
import { targetStyles } from './nav-styles';

/** On phones: the places that do not fit the bar. */
export function MoreMenu({ items }: { items: NavItem[] }) {
  const { role } = useSession();
  return (
    <Box display={{ base: 'flex', md: 'none' }} flex="1 1 0" minWidth="0">
      <Menu.Root positioning={{ placement: 'top-end' }}>
        <Menu.Trigger asChild>
          <chakra.button type="button" css={targetStyles(role)}>
            <Ellipsis size={22} strokeWidth={1.75} aria-hidden="true" />
            <span>More</span>
          </chakra.button>
        </Menu.Trigger>
        <Portal>
          <Menu.Positioner>
            <Menu.Content>
              {items.map((item) => (
                <Menu.Item key={item.to} value={item.to} asChild>
                  <Link to={item.to}>
                    <item.icon size={20} strokeWidth={1.75} aria-hidden="true" />
                    {item.label}
                  </Link>
                </Menu.Item>
              ))}
            </Menu.Content>
          </Menu.Positioner>
        </Portal>
      </Menu.Root>
    </Box>
  );
}

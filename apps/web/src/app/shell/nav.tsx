import { Box, chakra } from '@chakra-ui/react';
import { NavLink } from 'react-router-dom';
import { useSession } from '../session';
import { AccountMenu } from './account-menu';
import { Brand, BrandMark } from './brand';
import { MorePlaces } from './more-places';
import { accountItem, homeOf, howItem, navItems } from './nav-items';
import type { NavItem } from './nav-items';
import { hasSidebar, navStyles, targetStyles } from './nav-styles';

const Target = chakra(NavLink);
/** So many targets fit a phone's bar beside the last, which opens the rest. */
const ON_PHONE = 3;

function NavTarget({ item, phone = true }: { item: NavItem; phone?: boolean }) {
  const { role } = useSession();
  const display = { base: phone ? 'flex' : 'none', md: 'flex' };
  return (
    <Target to={item.to} end={item.to === '/'} css={targetStyles(role)} display={display}>
      <item.icon size={22} strokeWidth={1.75} aria-hidden="true" />
      <span>{item.label}</span>
    </Target>
  );
}

/** The one navigation, laid out by role and width. */
export function Nav() {
  const { role } = useSession();
  const items = navItems[role];
  return (
    <Box as="nav" aria-label="Main" css={navStyles(role)}>
      <Target
        to={homeOf(role)}
        aria-label="Halfpitch, start page"
        aria-current={undefined}
        display={{ base: 'none', md: 'flex' }}
        justifyContent={{ base: 'center', lg: hasSidebar(role) ? 'flex-start' : 'center' }}
        px={{ lg: hasSidebar(role) ? 3 : 0 }}
        mb="4"
        color="steel.fg"
      >
        <Box hideBelow={hasSidebar(role) ? 'lg' : undefined} display={hasSidebar(role) ? undefined : 'none'}>
          <Brand />
        </Box>
        <Box hideFrom={hasSidebar(role) ? 'lg' : undefined}>
          <BrandMark />
        </Box>
      </Target>
      {items.map((item, i) => (
        <NavTarget key={item.to} item={item} phone={i < ON_PHONE} />
      ))}
      <MorePlaces items={[...items.slice(ON_PHONE), howItem, accountItem]} />
      <Box flex="1" hideBelow="md" />
      <NavTarget item={howItem} phone={false} />
      <AccountMenu />
    </Box>
  );
}

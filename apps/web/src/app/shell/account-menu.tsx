import { Box, chakra, Text } from '@chakra-ui/react';
import { LogOut, Settings2, UserRound } from 'lucide-react';
import { NavLink } from 'react-router-dom';
import { LookTiles } from '../../components/look-tiles';
import { toastError } from '../../components/toaster';
import { useSession, useSignOut } from '../session';
import { besideNav, targetStyles } from './nav-styles';
import { panelLine, PopPanel } from './pop-panel';
import { WorkshopSwitch } from './workshop-switch';

const Line = chakra(NavLink, { base: panelLine });

/** Settings, look, workshop and the way out; on phones the account page stands for it. */
export function AccountMenu() {
  const { account, role, workshop } = useSession();
  const signOut = useSignOut();
  const buttonStyles = { ...targetStyles(role), display: { base: 'none', md: 'flex' } };
  return (
    <PopPanel label="Account" icon={UserRound} buttonStyles={buttonStyles} place={besideNav(role)}>
      <Box px="3" pt="1" pb="2">
        <Text fontWeight="semibold">{account.name}</Text>
        <Text color="fg.muted" textStyle="sm">
          {workshop.name}, {workshop.town}
        </Text>
      </Box>
      <Line to="/account">
        <Settings2 size={18} aria-hidden="true" /> Settings
      </Line>
      <Box px="3" py="2">
        <LookTiles />
      </Box>
      <WorkshopSwitch />
      <chakra.button type="button" css={panelLine} onClick={() => void signOut().catch(toastError)}>
        <LogOut size={18} aria-hidden="true" /> Sign out
      </chakra.button>
    </PopPanel>
  );
}

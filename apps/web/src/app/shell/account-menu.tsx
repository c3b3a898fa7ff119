import { chakra, Menu, Portal, Text } from '@chakra-ui/react';
import { LogOut, Settings2, UserRound } from 'lucide-react';
import { Link } from 'react-router-dom';
import { toastError } from '../../components/toaster';
import { colorModes, setColorMode, useColorMode } from '../color-mode';
import type { ColorMode } from '../color-mode';
import { colorModeWords } from '../color-mode-words';
import { useSession, useSignOut } from '../session';
import { targetStyles } from './nav-styles';

function LookChoice() {
  const mode = useColorMode();
  return (
    <Menu.RadioItemGroup value={mode} onValueChange={({ value }) => setColorMode(value as ColorMode)}>
      <Menu.ItemGroupLabel>Look</Menu.ItemGroupLabel>
      {colorModes.map((choice) => (
        <Menu.RadioItem key={choice} value={choice} closeOnSelect={false}>
          {colorModeWords[choice]}
          <Menu.ItemIndicator />
        </Menu.RadioItem>
      ))}
    </Menu.RadioItemGroup>
  );
}

/** Settings, look and the way out; on phones the account page stands for it. */
export function AccountMenu() {
  const { account, role, workshop } = useSession();
  const signOut = useSignOut();
  return (
    <Menu.Root positioning={{ placement: 'right-end' }}>
      <Menu.Trigger asChild>
        <chakra.button type="button" css={targetStyles(role)} display={{ base: 'none', md: 'flex' }}>
          <UserRound size={22} strokeWidth={1.75} aria-hidden="true" />
          <span>Account</span>
        </chakra.button>
      </Menu.Trigger>
      <Portal>
        <Menu.Positioner>
          <Menu.Content>
            <Text px="3" pt="2" fontWeight="semibold">
              {account.name}
            </Text>
            <Text px="3" pb="2" color="fg.muted" textStyle="sm">
              {workshop.name}, {workshop.town}
            </Text>
            <Menu.Separator />
            <Menu.Item value="settings" asChild>
              <Link to="/account">
                <Settings2 size={18} aria-hidden="true" /> Settings
              </Link>
            </Menu.Item>
            <LookChoice />
            <Menu.Separator />
            <Menu.Item value="sign-out" onClick={() => void signOut().catch(toastError)}>
              <LogOut size={18} aria-hidden="true" /> Sign out
            </Menu.Item>
          </Menu.Content>
        </Menu.Positioner>
      </Portal>
    </Menu.Root>
  );
}

import { chakra } from '@chakra-ui/react';
import { Ellipsis } from 'lucide-react';
import { NavLink } from 'react-router-dom';
import { useSession } from '../session';
import type { NavItem } from './nav-items';
import { targetStyles } from './nav-styles';
import { panelLine, PopPanel } from './pop-panel';

const Line = chakra(NavLink, { base: panelLine });
const place = { bottom: '4.75rem', right: 2 };

/** On phones: the places that do not fit the bar. */
export function MorePlaces({ items }: { items: NavItem[] }) {
  const { role } = useSession();
  const buttonStyles = { ...targetStyles(role), display: { base: 'flex', md: 'none' } };
  return (
    <PopPanel label="More" icon={Ellipsis} buttonStyles={buttonStyles} place={place}>
      {items.map((item) => (
        <Line key={item.to} to={item.to}>
          <item.icon size={20} strokeWidth={1.75} aria-hidden="true" />
          {item.label}
        </Line>
      ))}
    </PopPanel>
  );
}

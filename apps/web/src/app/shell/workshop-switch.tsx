import { chakra } from '@chakra-ui/react';
import { Building2 } from 'lucide-react';
import { toastError } from '../../components/toaster';
import { useSession } from '../session';
import { useChooseWorkshop } from '../workshop-choice';
import { panelLine } from './pop-panel';

/** For who belongs to several workshops: a line for each of the others. */
export function WorkshopSwitch() {
  const { workshop, workshops } = useSession();
  const choose = useChooseWorkshop();
  const others = workshops.filter(({ id }) => id !== workshop.id);
  return others.map(({ id, name }) => (
    <chakra.button
      key={id}
      type="button"
      data-closes
      css={panelLine}
      onClick={() => void choose(id).catch(toastError)}
    >
      <Building2 size={18} aria-hidden="true" /> Work in {name}
    </chakra.button>
  ));
}

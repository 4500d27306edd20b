import { useSearchParams } from 'react-router-dom';
import { Button } from '../../ui/button';
import { Menu } from '../../ui/menu';
import { useTableParams } from '../../ui/use-table-params';
import { FIRST_SORT } from './candidate-list-params';

export interface Choice {
  id: string;
  name: string;
}

interface FilterMenuProps {
  name: string;
  /** Its word in the address. */
  param: string;
  choices: readonly Choice[];
}

/** A filter by one value; the button shows the value that is chosen. */
export function FilterMenu({ name, param, choices }: FilterMenuProps) {
  const [params] = useSearchParams();
  const { setFilter } = useTableParams(FIRST_SORT);
  const chosen = choices.find(({ id }) => id === params.get(param));
  const items = [{ id: '', name: 'All' }, ...choices].map((choice) => ({
    ...choice,
    selected: choice.id === (chosen?.id ?? ''),
    onSelect: () => setFilter(param, choice.id),
  }));
  return (
    <Menu
      groups={[{ id: param, items }]}
      anchor={(props) => (
        <Button {...props} trailingIcon="down">
          {chosen ? `${name}: ${chosen.name}` : name}
        </Button>
      )}
    />
  );
}

import { Suspense, lazy, useId, useRef, useState } from 'react';
import type { ReactNode, Ref } from 'react';

// Loaded when somebody is about to open a menu: it is a fifth of what a page weighs.
const load = () => import('./menu-overlay');
const MenuOverlay = lazy(async () => ({ default: (await load()).MenuOverlay }));

interface MenuItem {
  id: string;
  name: string;
  /** Second, quiet line. */
  detail?: string;
  /** Within a group of choices: whether this one holds. Leave out for actions. */
  selected?: boolean;
  onSelect: () => void;
}

export interface MenuGroup {
  id: string;
  heading?: string;
  items: readonly MenuItem[];
}

interface MenuAnchor {
  id: string;
  ref: Ref<HTMLButtonElement>;
  type: 'button';
  'aria-haspopup': 'menu';
  'aria-expanded': boolean;
  onClick: () => void;
  onPointerEnter: () => void;
  onFocus: () => void;
}

export interface MenuProps {
  groups: readonly MenuGroup[];
  /** Draws the button; spread what it is given onto it. */
  anchor: (props: MenuAnchor) => ReactNode;
  width?: 'small' | 'medium';
  side?: 'outside-top' | 'outside-bottom';
}

/** A button that opens a menu of actions or choices. */
export function Menu({ groups, anchor, width = 'small', side = 'outside-bottom' }: MenuProps) {
  const [open, setOpen] = useState(false);
  const button = useRef<HTMLButtonElement>(null);
  const id = useId();
  const preload = () => void load();
  return (
    <>
      {anchor({
        id,
        ref: button,
        type: 'button',
        'aria-haspopup': 'menu',
        'aria-expanded': open,
        onClick: () => setOpen(!open),
        onPointerEnter: preload,
        onFocus: preload,
      })}
      {open && (
        <Suspense>
          <MenuOverlay
            {...{ groups, width, side }}
            labelledBy={id}
            anchorRef={button}
            onClose={() => setOpen(false)}
          />
        </Suspense>
      )}
    </>
  );
}

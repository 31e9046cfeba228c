import { DropdownMenu } from 'radix-ui';
import { useState } from 'react';
import { useNavigate } from 'react-router';
import { roleTitles } from '../../../shared/access/roles.ts';
import type { SessionUser } from '../../../shared/schemas/session.ts';
import { useSignIn } from '../../lib/session.ts';
import { buttonClass } from '../../ui/buttonClass.ts';
import { chosenTheme, chooseTheme, themes, type Theme } from './theme.ts';

const itemClass =
  'cursor-pointer rounded px-3 py-1.5 outline-none data-[highlighted]:bg-hover data-[state=checked]:font-bold';

/** Who is signed in, the theme, and signing out. */
export function AccountMenu({ user }: { user: SessionUser }) {
  const { signOut } = useSignIn();
  const navigate = useNavigate();
  const [theme, setTheme] = useState<Theme>(chosenTheme);
  const leave = async () => {
    await signOut();
    await navigate('/sign-in', { replace: true });
  };
  return (
    <DropdownMenu.Root>
      <DropdownMenu.Trigger className={buttonClass('quiet')}>
        {user.name}
        <span aria-hidden="true">▾</span>
      </DropdownMenu.Trigger>
      <DropdownMenu.Portal>
        <DropdownMenu.Content
          align="end"
          className="z-20 min-w-56 rounded-lg border border-line bg-raised p-1.5 text-ink shadow-lg"
        >
          <DropdownMenu.Label className="px-3 py-1.5 text-sm text-muted">
            {user.email}
            <br />
            {user.roles.map((role) => roleTitles[role]).join(', ')}
          </DropdownMenu.Label>
          <DropdownMenu.Separator className="my-1 h-px bg-line" />
          <DropdownMenu.RadioGroup
            value={theme}
            onValueChange={(value) => {
              setTheme(chooseTheme(value as Theme));
            }}
          >
            {themes.map(({ value, text }) => (
              <DropdownMenu.RadioItem key={value} value={value} className={itemClass}>
                {value === theme ? '✓ ' : ''}
                {text}
              </DropdownMenu.RadioItem>
            ))}
          </DropdownMenu.RadioGroup>
          <DropdownMenu.Separator className="my-1 h-px bg-line" />
          <DropdownMenu.Item className={itemClass} onSelect={() => void leave()}>
            Sign out
          </DropdownMenu.Item>
        </DropdownMenu.Content>
      </DropdownMenu.Portal>
    </DropdownMenu.Root>
  );
}

import { Popover } from '@radix-ui/themes';
import type { SessionView } from '@brimgate/rules';
import { useState } from 'react';
import { Link, NavLink } from 'react-router-dom';
import { AccountPanel } from '../features/accounts/account-panel';
import { roleWords, yardWords } from '../features/accounts/role-words';
import { paths } from '../paths';
import styles from './header.module.css';
import { Mark } from './mark';
import { navigationOf } from './navigation';

export function Header({ session }: { session: SessionView }) {
  const [isMenuOpen, setIsMenuOpen] = useState(false);
  const { person, membership } = session;
  const links = <NavigationLinks session={session} onFollow={() => setIsMenuOpen(false)} />;
  const account = <AccountPanel session={session} workPath={paths.work()} signInPath={paths.signIn()} />;
  return (
    <header className={`${styles.header} no-print`}>
      <div className={styles.bar}>
        <Link to={paths.work()} className={styles.brand}>
          <Mark />
          Brimgate
        </Link>
        <nav className={styles.wideLinks} aria-label="Main">
          {links}
        </nav>
        <Popover.Root>
          <Popover.Trigger>
            <button type="button" className={styles.person}>
              <span className={styles.yards}>{yardWords(membership.role, membership.yards)} · </span>
              {person.name}, {roleWords[membership.role]}
            </button>
          </Popover.Trigger>
          <Popover.Content className={styles.account} align="end" aria-label="You and your settings">
            {account}
          </Popover.Content>
        </Popover.Root>
        <button
          type="button"
          className={styles.menuButton}
          aria-expanded={isMenuOpen}
          aria-controls="menu"
          onClick={() => setIsMenuOpen((isOpen) => !isOpen)}
        >
          {isMenuOpen ? 'Close' : 'Menu'}
        </button>
      </div>
      <div id="menu" className={styles.menu} hidden={!isMenuOpen}>
        <nav aria-label="Main" className={styles.narrowLinks}>
          {links}
        </nav>
        {isMenuOpen && account}
      </div>
    </header>
  );
}

function NavigationLinks({ session, onFollow }: { session: SessionView; onFollow: () => void }) {
  return (
    <ul className={styles.links}>
      {navigationOf[session.membership.role].map((item) => (
        <li key={item.to}>
          <NavLink to={item.to} end={item.to === paths.work()} className={styles.link} onClick={onFollow}>
            {item.label}
          </NavLink>
        </li>
      ))}
    </ul>
  );
}

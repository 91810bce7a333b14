import Keyboard from 'lucide-react-native/icons/keyboard';
import LogOut from 'lucide-react-native/icons/log-out';
import SunMoon from 'lucide-react-native/icons/sun-moon';
import { useTheme } from '@/components/theme';
import { IconButton, Person } from '@/components/ui';

interface RailFootProps {
  name: string;
  onKeys: () => void;
  onSignOut: () => void;
}

/** At the foot of the rail: the keys, the theme, oneself and the way out. */
export function RailFoot({ name, onKeys, onSignOut }: RailFootProps) {
  const { theme, toggleTheme } = useTheme();
  return (
    <>
      <IconButton icon={Keyboard} label="Keys" onPress={onKeys} />
      <IconButton
        icon={SunMoon}
        label={theme === 'dark' ? 'Light theme' : 'Dark theme'}
        onPress={toggleTheme}
      />
      <IconButton icon={LogOut} label={`Sign out ${name}`} onPress={onSignOut} />
      <Person name={name} />
    </>
  );
}

import { useTheme } from '#src/lib/theme.ts';
import { Button } from '#src/ui/button.tsx';

/** Changes between day and melt room; its words name the theme it leads to. */
export const ThemeButton = () => {
  const [theme, toggle] = useTheme();
  const isDay = theme === 'day';
  return (
    <Button size="terminal" icon={isDay ? 'melt-room' : 'day'} className="!gap-3 !px-4" onClick={toggle}>
      {isDay ? 'Melt room' : 'Day'}
    </Button>
  );
};

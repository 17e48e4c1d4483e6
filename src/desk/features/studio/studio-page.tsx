import { useQuery } from '@tanstack/react-query';
import { studioQuery } from '#src/api/studio.ts';
import { PageTitle } from '#src/ui/page-title.tsx';
import { Loaded } from '#src/desk/parts/loaded.tsx';
import { StudioForm } from './studio-form.tsx';

/** The studio's settings: every card is computed from them. */
export const StudioPage = () => {
  // Read once: a refetch must not take away the version that the form was opened with.
  const studio = useQuery({ ...studioQuery, refetchOnWindowFocus: false });
  return (
    <>
      <PageTitle
        title="Settings of the studio"
        summary="Pour cards are computed from these figures. Each carries its source, and every card shows it."
      />
      <Loaded query={studio} what="the settings">
        {(settings) => <StudioForm studio={settings} />}
      </Loaded>
    </>
  );
};

import { Course } from '@/components/ui/course';
import { EmptyState } from '@/components/ui/empty-state';

export function NoWalls({ homeId }: { homeId: string }) {
  return (
    <Course as="div">
      <EmptyState title="This home has no walls yet" action={{ href: `/homes/${homeId}/walls/new`, label: 'Add a wall' }}>
        <p>A wall is one straight face with one direction: say how wide and high it is and which way it faces, for example 40 ft by 9 ft, facing south-west. The sun on it, the life of its coat and its next work follow at once.</p>
      </EmptyState>
    </Course>
  );
}

import { LoadingCourses } from '@/components/ui/loading-courses';

export default function Loading() {
  return <LoadingCourses label="Loading your homes" count={3} />;
}

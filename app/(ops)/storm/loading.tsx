import { Progress } from '@/components/ui/progress';

export default function Loading() {
  return (
    <div className="max-w-md p-8">
      <Progress label="Reading the storm" />
    </div>
  );
}

export default function RoadsLoading() {
  return (
    <div role="status" className="grid h-full min-h-[60dvh] place-items-center text-soft">
      Reading the roads
    </div>
  );
}

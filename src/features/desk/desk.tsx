export function Desk({ build, number }: { build: string; number: number }) {
  return <p>{build} {number}</p>;
}

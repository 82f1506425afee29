export default function LandingPage() {
  return (
    <main>
      <h1>See it turn. Then cut it.</h1>
    </main>
  );
}

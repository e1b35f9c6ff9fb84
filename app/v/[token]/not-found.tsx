/** Guessed, ended and revoked links get this one answer. */
export default function VisitNotFound() {
  return (
    <main className="in-sun mx-auto min-h-dvh max-w-phone bg-sheet px-5 py-8">
      <h1 className="text-title font-bold">This link opens nothing</h1>
      <p className="mt-3 text-lead">
        It may have ended, or part of it was cut off. Your shop’s newest message has the link that
        works; or ring them.
      </p>
      <p className="mt-4 text-lead" lang="es">
        Este enlace ya no abre nada. El mensaje más reciente del taller trae el que sirve; o
        llámelos.
      </p>
    </main>
  );
}

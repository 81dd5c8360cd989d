export const metadata = { title: 'Empty', description: 'Nothing but Next.js and React.' };

export default function Layout({ children }) {
  return (
    <html lang="en">
      <body>{children}</body>
    </html>
  );
}

/** The start page. */
export default function StartPage() {
  return <h1 className="pt-10 text-start">A year of heat, laid hour by hour.</h1>;
}

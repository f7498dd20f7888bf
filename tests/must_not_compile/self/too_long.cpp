// names: wall, film
// complaint: more than 20:
struct wall {};
struct film {};
void at(film);
#ifdef TWIN
void f() { at(film{}); }
#else
void f() {
  at(wall{});
  at(wall{});
  at(wall{});
  at(wall{});
  at(wall{});
  at(wall{});
}
#endif

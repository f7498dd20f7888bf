// names: film_temperature, film
// complaint: the message does not say 'film'
struct wall_temperature {};
struct film_temperature {};
void at(film_temperature);
#ifdef TWIN
void f() { at(film_temperature{}); }
#else
void f() { at(wall_temperature{}); }
#endif

#ifndef CONVELOPE_MARK_HPP
#define CONVELOPE_MARK_HPP

// The mark every evaluating function carries. A host that compiles for a device defines it
// before the first include, e.g. as `__host__ __device__`.
#ifndef CONVELOPE_FUNCTION
#define CONVELOPE_FUNCTION
#endif

#endif

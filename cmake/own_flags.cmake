# What our own programs are compiled with: linked privately by tests, examples and benchmarks,
# never by a user of the library.
option(CONVELOPE_WARNINGS_AS_ERRORS "Warnings in our own programs are errors"
       ${PROJECT_IS_TOP_LEVEL})
set(CONVELOPE_SANITIZE "" CACHE STRING "Sanitizers for our own programs: address,undefined ...")
option(CONVELOPE_FAST_MATH "Compile our own programs with -ffast-math" OFF)
option(CONVELOPE_NO_EXCEPTIONS "Compile our own programs without exceptions and RTTI" OFF)

set(CMAKE_CXX_EXTENSIONS OFF)

add_library(convelope_own_flags INTERFACE)
target_compile_options(convelope_own_flags INTERFACE -Wall -Wextra -Wpedantic -Wconversion -Wshadow)
if(CONVELOPE_WARNINGS_AS_ERRORS)
  target_compile_options(convelope_own_flags INTERFACE -Werror)
endif()
if(CONVELOPE_SANITIZE)
  target_compile_options(convelope_own_flags INTERFACE -fsanitize=${CONVELOPE_SANITIZE}
                         -fno-sanitize-recover=all -fno-omit-frame-pointer -g1)
  target_link_options(convelope_own_flags INTERFACE -fsanitize=${CONVELOPE_SANITIZE})
endif()
if(CONVELOPE_FAST_MATH)
  target_compile_options(convelope_own_flags INTERFACE -ffast-math)
endif()
if(CONVELOPE_NO_EXCEPTIONS)
  target_compile_options(convelope_own_flags INTERFACE -fno-exceptions -fno-rtti)
endif()

# -O<level> unless a build type says otherwise.
function(convelope_optimise target level)
  target_compile_options(${target} PRIVATE $<$<CONFIG:>:-O${level}>)
endfunction()

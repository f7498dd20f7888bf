# Configures, builds and runs the consumer project NAME.
cmake_minimum_required(VERSION 3.22)
function(step)
  execute_process(COMMAND ${ARGV} RESULT_VARIABLE result OUTPUT_VARIABLE output
                  ERROR_VARIABLE output)
  if(NOT result EQUAL 0)
    list(JOIN ARGV " " command)
    string(REPLACE "\n" "\n  " output "${output}") # indented text is not wrapped
    message(FATAL_ERROR "  ${command}\n  ${output}")
  endif()
  set(output "${output}" PARENT_SCOPE)
endfunction()

file(REMOVE_RECURSE ${BINARY})
set(ENV{PKG_CONFIG_PATH} ${PREFIX}/share/pkgconfig)
step(${CMAKE_COMMAND} -S ${SOURCE}/${NAME} -B ${BINARY} -G ${GENERATOR}
     -DCMAKE_CXX_COMPILER=${COMPILER} -DCMAKE_PREFIX_PATH=${PREFIX}
     -DCMAKE_INSTALL_PREFIX=${BINARY}/installed -DLIBRARY=${LIBRARY} -DWANTED_VERSION=${VERSION}
     -DBoost_DIR=${BOOST} -DFETCHCONTENT_FULLY_DISCONNECTED=ON --warn-uninitialized -Werror=dev)
step(${CMAKE_COMMAND} --build ${BINARY})
step(${BINARY}/consumer)
if(NOT output STREQUAL "convelope ${VERSION}\n")
  message(FATAL_ERROR "the program said '${output}', expected 'convelope ${VERSION}'")
endif()

# What the consumer installs is its own program and nothing of ours.
if(NAME MATCHES "subdirectory|fetch")
  step(${CMAKE_COMMAND} --install ${BINARY})
  file(GLOB_RECURSE files RELATIVE ${BINARY}/installed ${BINARY}/installed/*)
  if(NOT files STREQUAL "bin/consumer")
    message(FATAL_ERROR "installed with the consumer: '${files}', expected 'bin/consumer'")
  endif()
endif()

if(COMPLAINTS)
  message(FATAL_ERROR "README.md:${COMPLAINTS}")
endif()
